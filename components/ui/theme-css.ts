import { darkPalette, lightPalette, type Palette } from './tokens';

const variables = (palette: Palette) => Object.entries(palette).map(([name, value]) => `--${name}:${value}`).join(';');

/**
 * The palettes as custom properties, so that a page drawn before any script has run already wears the right one.
 * `data-theme` on the root element overrides what the system asks for.
 */
export const themeCss = [
  `:root{${variables(lightPalette)};color-scheme:light}`,
  `@media (prefers-color-scheme:dark){:root:not([data-theme=light]){${variables(darkPalette)};color-scheme:dark}}`,
  `:root[data-theme=dark]{${variables(darkPalette)};color-scheme:dark}`,
].join('\n');

/** What React Native's styles cannot say: page ground, focus ring, tabular figures, reduced motion. */
export const pageCss = `
html,body,#root{height:100%}
body{margin:0;background:var(--paper);color:var(--ink);font-feature-settings:"tnum";-webkit-font-smoothing:antialiased}
#root{display:flex}
:focus-visible,input:focus,textarea:focus{outline:2px solid var(--ink)!important;outline-offset:2px!important}
::placeholder{color:var(--quiet);opacity:1}
svg text{font-feature-settings:"tnum"}
@media (prefers-reduced-motion:reduce){*,*::before,*::after{animation:none!important;transition:none!important;scroll-behavior:auto!important}}
`;
