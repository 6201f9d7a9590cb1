/** The one thing of react-dom that is used by name; its types are no part of this project. */
declare module 'react-dom' {
  import type { ReactNode, ReactPortal } from 'react';

  export function createPortal(children: ReactNode, container: Element): ReactPortal;
}
