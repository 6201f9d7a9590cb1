/**
 * What a browser has and jsdom lacks. Each stands in only where it is missing, and does the least that a component
 * under test can notice.
 */
import { webcrypto } from 'node:crypto';
import { TextDecoder, TextEncoder } from 'node:util';
import { deserialize, serialize } from 'node:v8';

class NoResizeObserver implements ResizeObserver {
  observe(): void {}
  unobserve(): void {}
  disconnect(): void {}
}

class MousePointerEvent extends MouseEvent {
  readonly pointerId: number;
  readonly pointerType: string;
  readonly isPrimary: boolean;

  constructor(type: string, init: PointerEventInit = {}) {
    super(type, init);
    this.pointerId = init.pointerId ?? 1;
    this.pointerType = init.pointerType ?? 'mouse';
    this.isPrimary = init.isPrimary ?? true;
  }
}

/** A wide light screen whose owner has nothing against motion: no query matches. */
function matchNothing(query: string): MediaQueryList {
  return {
    matches: false,
    media: query,
    onchange: null,
    addEventListener() {},
    removeEventListener() {},
    addListener() {},
    removeListener() {},
    dispatchEvent: () => false,
  };
}

function supply(target: object, missing: Record<string, unknown>): void {
  for (const [name, value] of Object.entries(missing)) {
    if (!(name in target)) Object.defineProperty(target, name, { value, writable: true, configurable: true });
  }
}

supply(globalThis, {
  matchMedia: matchNothing,
  ResizeObserver: NoResizeObserver,
  PointerEvent: MousePointerEvent,
  TextDecoder,
  TextEncoder,
  structuredClone: (value: unknown) => deserialize(serialize(value)) as unknown,
});
supply(globalThis.crypto, { randomUUID: () => webcrypto.randomUUID(), subtle: webcrypto.subtle });
supply(Element.prototype, {
  setPointerCapture() {},
  releasePointerCapture() {},
  hasPointerCapture: () => false,
  scrollIntoView() {},
});
