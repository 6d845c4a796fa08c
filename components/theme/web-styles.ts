import { fontFaces } from './font-faces';
import { border, breakpoints, colors, motion, radius, shadow, type, type TextVariant, type TypeScale } from './tokens';
import { family, type Weight } from './fonts';
import { pageStyles } from '../ui/page-styles';
import { landingStyles } from '../landing/landing-styles';

const wideOnly = (rules: string) => `@media (min-width:${breakpoints.wide}px){${rules}}`;

/** Sizes of the variants that grow on wide windows; `!important`, because react-native-web writes the phone's size into the element. */
const wideType = (Object.keys(type) as TextVariant[])
  .map((variant) => {
    const { wide }: TypeScale = type[variant];
    if (!wide) return '';
    const spacing = wide.spacingEm === undefined ? '' : `;letter-spacing:${wide.spacingEm}em!important`;
    return `[data-type="${variant}"]{font-size:${wide.size}px!important;line-height:${wide.line}px!important${spacing}}`;
  })
  .join('');

const font = (weight: Weight, size: number, line: number) => `font-family:${family[weight]};font-size:${size}px;line-height:${line}px`;

const ring = (color: string) => `outline:3px solid ${color};outline-offset:3px`;
const unseen = 'position:absolute;width:1px;height:1px;margin:-1px;overflow:hidden;clip-path:inset(50%);white-space:nowrap';

const focus = [
  ':focus{outline:none}',
  `:focus-visible,.ui-choice:has(.ui-input:focus-visible){${ring(colors.focus)};border-radius:${radius.small}px}`,
  `.ui-choice:has(.ui-input:focus-visible){border-radius:${radius.button + 1}px}`,
  `.ui-choice .ui-input:focus-visible{outline:none}`,
  `[data-surface="spruce"] :focus-visible,[data-surface="dark"] :focus-visible{outline-color:${colors.focusDark}}`,
  `[data-control="box"]:focus-visible,.ui-select:focus-visible{border-radius:${radius.field}px}`,
  // The ring of a stepper goes round the whole of it.
  `[data-control="inner"]:focus-visible{outline:none}[data-control="frame"]:has([data-control="inner"]:focus-visible){${ring(colors.focus)}}`,
  // Headings and messages get the focus to be read, not to be pressed.
  'h1:focus-visible,h2:focus-visible,[data-control="message"]:focus-visible{outline-offset:6px}h1:focus,h1:focus-visible{outline:none}',
].join('');

const controls = [
  `.ui-unseen{${unseen}}`,
  `.ui-label{${font(800, 15, 20)};color:${colors.ink}}.ui-optional{${font(500, 14, 20)};color:${colors.ink2}}`,
  '.ui-group{display:flex;flex-direction:column;gap:8px;border:0;margin:0;padding:0;min-width:0}',
  '.ui-grid{display:grid;gap:10px}',
  '.ui-grid-two{grid-template-columns:repeat(auto-fit,minmax(min(260px,100%),1fr))}',
  '.ui-grid-two-short{grid-template-columns:repeat(auto-fit,minmax(min(260px,calc(50% - 5px)),1fr))}',
  '.ui-grid-three{grid-template-columns:repeat(auto-fit,minmax(min(190px,calc(50% - 5px)),1fr))}',
  '.ui-grid-three-long{grid-template-columns:repeat(auto-fit,minmax(min(190px,100%),1fr))}',
  '.ui-choice{position:relative;display:flex;cursor:pointer;min-width:0;-webkit-tap-highlight-color:transparent}',
  '.ui-input{position:absolute;inset:0;width:100%;height:100%;margin:0;opacity:0;cursor:pointer}',
  `.ui-segment{flex:1}.ui-tick{align-items:flex-start;gap:12px;min-height:44px;padding:9px 0}.ui-tick-words{display:flex;flex-direction:column;${font(600, 16, 24)};color:${colors.ink}}`,
  '.ui-select-frame{position:relative}',
  `.ui-select{appearance:none;width:100%;min-height:50px;${font(700, 16, 24)};color:${colors.ink};background:${colors.card};border:${border.control}px solid ${colors.edge};` +
    `border-radius:${radius.field}px;padding:0 44px 0 16px;cursor:pointer;text-overflow:ellipsis}`,
  `.ui-select-desk{min-height:44px;border-radius:${radius.small}px;font-size:15px;padding-left:12px}.ui-wrong{border:${border.chosen}px solid ${colors.stop}}`,
  '.ui-select-mark{position:absolute;right:14px;top:0;bottom:0;display:flex;align-items:center;pointer-events:none}',
].join('');

const dialogue = [
  `.ui-dialogue{border:0;padding:0;margin:auto auto 0;width:100%;max-width:100%;color:${colors.ink};background:${colors.card};border-radius:${radius.sheet}px ${radius.sheet}px 0 0;box-shadow:${shadow.sheet}}`,
  '.ui-dialogue::backdrop{background:rgba(18,48,42,.45)}.ui-dialogue-body{padding:24px 24px max(24px,env(safe-area-inset-bottom))}',
  `.ui-dialogue[open]{animation:ui-rise ${motion.sheetIn}ms ease-out}@keyframes ui-rise{from{transform:translateY(24px);opacity:0}}`,
  `@media (min-width:${breakpoints.tablet}px){.ui-dialogue{margin:auto;width:420px;border-radius:${radius.sheet}px}}`,
].join('');

const table = [
  `.ui-table-frame{background:${colors.card};border:1px solid ${colors.rule};border-radius:${radius.button}px;overflow-x:auto}`,
  `.ui-table{width:100%;border-collapse:collapse;text-align:left;${font(500, 15, 21)};color:${colors.ink}}`,
  `.ui-table th,.ui-table td{padding:9px 12px;vertical-align:middle;font-weight:inherit}.ui-table thead th{${font(800, 13, 18)};color:${colors.ink2};border-bottom:2px solid ${colors.ink};white-space:nowrap}`,
  `.ui-table tbody tr{border-top:1px solid ${colors.rule}}.ui-table tbody tr:first-child{border-top:0}.ui-table tbody tr:hover{background:${colors.well}}`,
  `.ui-table tbody tr[aria-current]{background:${colors.spruceWash};box-shadow:inset 4px 0 ${colors.copper}}`,
  '.ui-right{text-align:right}.ui-table .ui-right>*{align-items:flex-end;margin-left:auto}.ui-table .ui-row-link{text-decoration:none;color:inherit;display:inline-flex;min-height:44px;min-width:44px;align-items:center}',
  `.ui-sort{all:unset;cursor:pointer;display:inline-flex;gap:4px;align-items:center;min-height:32px;${font(800, 13, 18)};color:${colors.ink}}`,
].join('');

const movement = [
  `[data-slides="handle"]{transition:left ${motion.handle}ms ease-out}`,
  `[data-slides="tape"]{transition:left ${motion.tape}ms ease-in-out ${motion.tapePause}ms,right ${motion.tape}ms ease-in-out ${motion.tapePause}ms}`,
  '[data-turning]{animation:ui-turn 1s linear infinite}@keyframes ui-turn{to{transform:rotate(360deg)}}',
  '[data-bar]{animation:ui-breathe 1.4s linear infinite alternate}@keyframes ui-breathe{from{opacity:1}to{opacity:.55}}',
  '@media (prefers-reduced-motion:reduce){*,*::before,*::after{transition-duration:0s!important;transition-delay:0s!important;animation:none!important}}',
].join('');

const surfaces = '[data-type="display"],[data-type="title"],[data-type="price"]{text-wrap:balance}' + wideOnly('[data-padded][data-padded]{padding:20px}');

/**
 * The one style sheet of the document, put into the static page's head: fonts, sizes that depend on the window, focus, motion, and
 * the few real controls of the browser. Only app/+html.tsx imports it, so it is in no script.
 */
export const webStyles = [fontFaces, surfaces, wideOnly(wideType), focus, controls, dialogue, table, movement, pageStyles, landingStyles].join('');
