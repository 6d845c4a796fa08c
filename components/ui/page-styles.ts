import { breakpoints, colors } from '../theme/tokens';

/** How the page's shell changes with the window: laid out by the browser, so the static page is right before any script. */
export const pageStyles = [
  `.ui-skip{position:absolute;left:16px;top:-80px;z-index:40;background:${colors.ink};color:${colors.paper}!important;padding:12px 16px;border-radius:12px}.ui-skip:focus{top:12px}`,
  '[data-part="page"][data-part]{min-height:100vh;min-height:100dvh}',
  `@media (min-width:${breakpoints.tablet}px){[data-part="header"][data-part]{padding-left:32px;padding-right:32px}[data-part="main"][data-width="text"][data-width],[data-part="main"][data-width="normal"][data-width]{padding-left:32px;padding-right:32px}}`,
  `@media (max-width:${breakpoints.tablet - 1}px){[data-only="wide"],[data-only="tablet-up"]{display:none!important}}`,
  `@media (min-width:${breakpoints.tablet}px){[data-only="phone"]{display:none!important}}`,
  `@media (max-width:${breakpoints.wide - 1}px){[data-only="wide"]{display:none!important}}`,
  `@media (min-width:${breakpoints.wide}px){[data-only="narrow"]{display:none!important}` +
    '[data-part="header"][data-part]{padding-left:48px;padding-right:48px;min-height:72px}' +
    '[data-part="main"][data-width="normal"][data-width]{padding-left:48px;padding-right:48px;max-width:1440px}' +
    '[data-part="main"][data-width="text"][data-width]{max-width:760px}' +
    '[data-directory="2"][data-directory]{display:grid;grid-template-columns:1fr 1fr;column-gap:36px}[data-directory="3"][data-directory]{display:grid;grid-template-columns:1fr 1fr 1fr;column-gap:36px}' +
    '[data-directory="2"][data-directory]>[data-line="first"][data-line],[data-directory="3"][data-directory]>[data-line="first"][data-line]{border-top-width:0}}',
  // The desk's rail stays beside the page and scrolls by itself when the window is low.
  '[data-part="rail"][data-part]{position:sticky;top:0;height:100vh;height:100dvh;overflow-y:auto}',
  `@media (min-width:${breakpoints.tablet}px){[data-part="panel-drawing"][data-part]{height:236px;flex-basis:300px;flex-shrink:0}}`,
  // Under 360 px a tile of the board has no room for its glyph; the name says the same.
  '@media (max-width:359px){[data-part="load-glyph"],[data-part="load-number"]{display:none!important}}',
  // Where a toast stands on wide windows.
  '[data-part="corner"][data-part]{position:fixed;left:0;right:0;bottom:0;height:0;z-index:30}',
  // A field that gets the focus must not hide under the dock.
  'html:has([data-part="dock"][data-part]){scroll-padding-bottom:240px}',
  // A low window (a keyboard is up, a phone lies on its side): one line.
  '@media (max-height:699px){[data-low="hide"]{display:none!important}[data-part="dock"][data-part]{padding-top:8px;padding-bottom:8px}' +
    '[data-part="dock-inner"][data-part]{flex-wrap:nowrap;align-items:center}[data-part="dock-back"]{order:-1}[data-part="dock-range"][data-part]{width:auto;flex-shrink:1}' +
    '[data-part="dock-range"] [data-type="figure"][data-type]{font-size:17px;line-height:22px}html:has([data-part="dock"]){scroll-padding-bottom:96px}}',
  // Large text or a low window: the dock becomes part of the page.
  '[data-part="dock"][data-part]{position:sticky;bottom:0}@media (max-height:419px){[data-part="dock"][data-part]{position:static}}',
].join('');
