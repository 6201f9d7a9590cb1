import 'react-native';
import type { KeyboardEvent, MouseEvent } from 'react';

/** What react-native-web hands to the DOM and React Native's own types do not know. */
interface WebProps {
  'aria-atomic'?: boolean;
  'aria-autocomplete'?: 'none' | 'list';
  'aria-colcount'?: number;
  'aria-controls'?: string;
  'aria-current'?: boolean | 'page' | 'step' | 'true';
  'aria-describedby'?: string;
  'aria-haspopup'?: boolean | 'dialog' | 'menu' | 'listbox';
  'aria-invalid'?: boolean;
  'aria-keyshortcuts'?: string;
  'aria-level'?: number;
  'aria-orientation'?: 'horizontal' | 'vertical';
  'aria-posinset'?: number;
  'aria-pressed'?: boolean;
  'aria-required'?: boolean;
  'aria-roledescription'?: string;
  'aria-rowcount'?: number;
  'aria-rowindex'?: number;
  'aria-setsize'?: number;
  'aria-sort'?: 'ascending' | 'descending' | 'none';
  dataSet?: Readonly<Record<string, string | undefined>>;
  href?: string;
  hrefAttrs?: { readonly download?: string | boolean; readonly rel?: string; readonly target?: string };
  inert?: boolean;
  lang?: string;
  onClick?: (event: MouseEvent<HTMLElement>) => void;
  onKeyDown?: (event: KeyboardEvent<HTMLElement>) => void;
  onKeyDownCapture?: (event: KeyboardEvent<HTMLElement>) => void;
  onMouseDown?: (event: MouseEvent<HTMLElement>) => void;
  onMouseEnter?: (event: MouseEvent<HTMLElement>) => void;
  onMouseLeave?: (event: MouseEvent<HTMLElement>) => void;
}

declare module 'react-native' {
  // eslint-disable-next-line @typescript-eslint/no-empty-object-type -- merging is the only way to add to it
  interface ViewProps extends WebProps {}
  // eslint-disable-next-line @typescript-eslint/no-empty-object-type
  interface TextProps extends WebProps {}
  interface TextInputProps {
    /** Height of a field of more than one line. */
    rows?: number;
  }
}
