import { useEffect, useRef } from 'react';

/**
 * Back closes a sheet or dialog before it leaves the page. Each open layer puts one entry with the page's own address and
 * the router's own state on the browser's history; going back takes it off again and closes the layer. To the router
 * such a step leads from a page to itself.
 */
interface Layer {
  readonly close: () => void;
}

const layers: Layer[] = [];

let listening = false;

/** When this module itself asked for steps back, ms; null once they have come. */
let steppingSince: number | null = null;

/** ms that a layer's entry is left standing after it closed, so that a navigation that follows at once is not undone. */
const GRACE = 60;

/** ms after which steps asked for have been overtaken by a navigation and will not come. */
const OVERTAKEN = 500;

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
    window.addEventListener('popstate', onPopState);
    listening = true;
  }
  layers.push(layer);
  if (!isStepping()) pushMissing();
}

function dropLayer(layer: Layer): void {
  const index = layers.indexOf(layer);
  if (index < 0) return;
  layers.splice(index, 1);
  setTimeout(clearStale, GRACE);
}

/** An entry left over from a layer that closed just now serves again; only what is missing is added. */
function pushMissing(): void {
  for (let depth = depthHere() + 1; depth <= layers.length; depth++) {
    window.history.pushState({ ...stateHere(), layer: depth }, '');
  }
}

/** Takes entries of closed layers off, unless a navigation has come on top meanwhile. */
function clearStale(): void {
  const stale = depthHere() - layers.length;
  if (stale <= 0) return;
  steppingSince = Date.now();
  window.history.go(-stale);
}

function onPopState(): void {
  if (isStepping()) {
    steppingSince = null;
    // A layer may have opened while the steps were on their way.
    pushMissing();
    return;
  }
  for (const layer of layers.splice(depthHere()).reverse()) layer.close();
  // Back or forward onto the entry of a layer that is long closed: go on to the page under it.
  clearStale();
}

const isStepping = (): boolean => steppingSince !== null && Date.now() - steppingSince < OVERTAKEN;

const stateHere = (): { readonly layer?: number } => (window.history.state as { readonly layer?: number } | null) ?? {};

const depthHere = (): number => stateHere().layer ?? 0;
