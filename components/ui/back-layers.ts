import { useEffect, useRef } from 'react';

/**
 * Back closes a sheet or dialog before it leaves the page. Each open layer stands on an entry of the browser's history that
 * has the page's own address and the router's own state; going back from it closes the layer. To the router such a step
 * leads from a page to itself.
 *
 * A layer that closes by itself leaves its entry where it is: a step back taken by the program arrives a moment later, and
 * would undo a navigation made meanwhile. The entry serves the next layer of the page; where none comes, the step from it
 * to the page under it, which shows nothing, goes on to the page before.
 */
interface Layer {
  readonly close: () => void;
}

const layers: Layer[] = [];

let listening = false;

/** The entry that the last layer or step left us on. */
let last: EntryState = {};

interface EntryState {
  /** Layers that this entry and those of the page under it stand for. */
  readonly layer?: number;
  /** The router's name of the page's entry, which the entries of layers repeat. */
  readonly id?: string;
}

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
  pushMissing();
}

function dropLayer(layer: Layer): void {
  const index = layers.indexOf(layer);
  if (index >= 0) layers.splice(index, 1);
}

/** An entry left over from a layer that closed serves again; only what is missing is added. */
function pushMissing(): void {
  for (let depth = depthOf(here()) + 1; depth <= layers.length; depth++) {
    window.history.pushState({ ...here(), layer: depth }, '');
  }
  last = here();
}

function onPopState(): void {
  const from = last;
  last = here();
  const depth = depthOf(last);
  if (layers.length > depth) {
    for (const layer of layers.splice(depth).reverse()) layer.close();
    return;
  }
  const back = from.id === last.id && depth < depthOf(from);
  if (back && layers.length < depthOf(from)) window.history.go(layers.length - depth - 1);
}

const here = (): EntryState => (window.history.state as EntryState | null) ?? {};

const depthOf = ({ layer }: EntryState): number => layer ?? 0;
