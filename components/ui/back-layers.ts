import { useEffect, useRef } from 'react';

/**
 * Back closes a sheet or dialog before it leaves the page. Each open layer puts one entry with the page's own address on
 * the browser's history; going back takes it off again and closes the layer. The router never hears of these entries.
 */
interface Layer {
  readonly close: () => void;
}

const layers: Layer[] = [];

/** Steps back that this module asked for itself. */
let silent = 0;

let listening = false;

/** ms that a layer's entry is left standing after it closed, so that a navigation that follows at once is not undone. */
const GRACE = 60;

/** While `open`, Back calls `onClose`. */
export function useBackCloses(open: boolean, onClose: () => void): void {
  const latest = useRef(onClose);
  useEffect(() => {
    latest.current = onClose;
  });
  useEffect(() => {
    if (!open) return;
    const layer: Layer = { close: () => latest.current() };
    pushLayer(layer);
    return () => dropLayer(layer);
  }, [open]);
}

function pushLayer(layer: Layer): void {
  if (!listening) {
    window.addEventListener('popstate', onPopState, { capture: true });
    listening = true;
  }
  layers.push(layer);
  // An entry left over from a layer that closed just now serves again.
  if (depthHere() < layers.length) window.history.pushState({ ...stateHere(), layer: layers.length }, '');
}

function dropLayer(layer: Layer): void {
  const index = layers.indexOf(layer);
  if (index < 0) return;
  layers.splice(index, 1);
  setTimeout(clearStale, GRACE);
}

/** Takes entries of closed layers off, unless a navigation has come on top meanwhile. */
function clearStale(): void {
  const stale = depthHere() - layers.length;
  if (stale <= 0) return;
  silent++;
  window.history.go(-stale);
}

function onPopState(event: PopStateEvent): void {
  if (silent > 0) {
    silent--;
    event.stopImmediatePropagation();
    return;
  }
  const depth = depthHere();
  if (layers.length > depth) {
    event.stopImmediatePropagation();
    for (const layer of layers.splice(depth).reverse()) layer.close();
  } else if (depth > layers.length) {
    // Back or forward onto the entry of a layer that is long closed: go on to the page under it.
    clearStale();
  }
}

const stateHere = (): { readonly layer?: number } => (window.history.state as { readonly layer?: number } | null) ?? {};

const depthHere = (): number => stateHere().layer ?? 0;
