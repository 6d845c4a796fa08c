import { breakpoints } from '../theme/tokens';

/** The landing page by width: laid out by the browser alone, so nothing moves when scripts arrive. */
export const landingStyles = [
  '[data-part="landing-words"][data-part]{position:relative;z-index:1}',
  `@media (min-width:${breakpoints.tablet}px) and (max-width:${breakpoints.wide - 1}px){[data-part="landing-words"][data-part]{width:100%;max-width:680px;align-self:center}[data-part="landing-picture"][data-part]{height:66vw}}`,
  `@media (min-width:${breakpoints.wide}px){` +
    '[data-part="landing-top"][data-part]{display:grid;grid-template-columns:minmax(540px,620px) 1fr;column-gap:20px;width:100%;align-self:center}' +
    '[data-part="landing-picture"][data-part]{grid-column:2;grid-row:1;height:min(560px,calc((100vw - 640px)*.7));border-radius:40px 0 0 40px}' +
    '[data-part="landing-words"][data-part]{grid-column:1;grid-row:1;margin-top:0;padding:28px 0 0 64px;gap:24px;background:none}' +
    '[data-part="landing-tape"][data-part]{background:none;border-width:0;padding:0;max-width:500px;margin-top:8px}' +
    '[data-part="landing-start"][data-part]{align-self:flex-start;order:1}[data-part="landing-start"] a{min-height:60px;padding-left:28px;padding-right:28px}[data-part="landing-tape"]{order:2}' +
    '[data-part="footer"][data-part]{margin-left:64px;margin-right:64px}' +
    '[data-part="landing-more"][data-part]{padding:32px 64px 40px}' +
    '[data-part="landing-card"][data-part]{display:grid;grid-template-columns:150px 1fr;column-gap:32px;padding:24px 28px}' +
    '[data-part="page"]:has([data-part="landing-top"]) [data-part="header"][data-part]{padding-left:64px;padding-right:64px}}',
  `@media (min-width:1600px){[data-part="landing-picture"][data-part]{border-radius:40px;margin-right:64px}[data-part="landing-top"][data-part]{max-width:1600px}}`,
].join('');
