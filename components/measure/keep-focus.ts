import type { MouseEvent } from 'react';

/** On a key of the pad: a click must not take the focus, or Enter and space would press that key again. */
export const keepFocus = (event: MouseEvent<HTMLElement>): void => event.preventDefault();
