import { COLOR_NAMES, palettes, type ThemeName } from './tokens';

const variables = (name: ThemeName): string => COLOR_NAMES.map((c) => `--${c}:${palettes[name][c]}`).join(';');

/**
 * What cannot be said in a component's own style: colours by theme, the focus ring, printing, reduced motion.
 * The system's theme holds unless the root element carries `data-theme`; paper always wins when printing.
 */
export function globalCss(): string {
  return [
    `:root{color-scheme:light;${variables('light')}}`,
    `@media (prefers-color-scheme:dark){:root:not([data-theme=light]){color-scheme:dark;${variables('dark')}}}`,
    `:root[data-theme=dark]{color-scheme:dark;${variables('dark')}}`,
    `@media print{:root:root:root{color-scheme:light;${variables('print')}}}`,
    'html,body,#root{height:100%}',
    'body{margin:0;background:var(--paper);color:var(--ink);overflow:hidden;-webkit-text-size-adjust:100%}',
    '@media print{html,body,#root{height:auto}body{overflow:visible}}',
    '*{-webkit-tap-highlight-color:transparent}',
    ':focus{outline:none}',
    // The ring stays chalk with a gap of the ground, also on chalk buttons.
    ':focus-visible{outline:3px solid var(--chalk);outline-offset:2px}',
    'input:focus-visible,textarea:focus-visible,select:focus-visible{outline-offset:0}',
    '[data-ring=none]:focus-visible{outline:none}',
    // Whatever takes the focus keeps clear of a bar or sheet at the foot.
    ':focus{scroll-margin:96px 0 96px 0}',
    '::placeholder{color:var(--ink2);opacity:1}',
    '@media (prefers-reduced-motion:reduce){*,*::before,*::after{animation-duration:0s!important;transition-duration:0s!important;scroll-behavior:auto!important}}',
    '@media (forced-colors:active){[data-keep-color]{forced-color-adjust:none}}',
  ].join('\n');
}
