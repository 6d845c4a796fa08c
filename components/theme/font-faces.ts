import { fontFiles } from './font-files';

/**
 * `adjust` and `wide`: Nunito's width as a share of Arial's and of DejaVu Sans', in per cent, measured over two sentences of this site
 * (Arial's widths: Helvetica's published metrics). Vertical metrics are Nunito's own.
 */
const faces = [
  { name: 'Nunito_400Regular', weight: 400, bold: false, adjust: 99.8, wide: 88 },
  { name: 'Nunito_500Medium', weight: 500, bold: false, adjust: 100.6, wide: 88.7 },
  { name: 'Nunito_600SemiBold', weight: 600, bold: false, adjust: 101.5, wide: 89.5 },
  { name: 'Nunito_700Bold', weight: 700, bold: true, adjust: 96.8, wide: 81.3 },
  { name: 'Nunito_800ExtraBold', weight: 800, bold: true, adjust: 99, wide: 83.1 },
] as const;

const ASCENT = 101.1;
const DESCENT = 35.3;

const local = (names: readonly string[]) => names.map((name) => `local("${name}")`).join(',');

/** A system font stretched to Nunito's measures; the overrides are shares of the stretched size. */
const standIn = (name: string, source: string, adjust: number) =>
  `@font-face{font-family:"${name}";src:${source};size-adjust:${adjust}%;ascent-override:${((ASCENT * 100) / adjust).toFixed(1)}%;` +
  `descent-override:${((DESCENT * 100) / adjust).toFixed(1)}%;line-gap-override:0%}`;

/** The `@font-face` rules of the whole site: text shows at once in a stand-in and swaps without moving. */
export const fontFaces = faces
  .map(
    ({ name, weight, bold: heavy, adjust, wide }) =>
      `@font-face{font-family:${name};src:url(${fontFiles[weight]}) format("woff2");font-display:swap}` +
      standIn(`Fallback ${weight}`, local(heavy ? ['Arial Bold', 'Arial-BoldMT', 'Liberation Sans Bold', 'Roboto Bold'] : ['Arial', 'ArialMT', 'Liberation Sans', 'Roboto']), adjust) +
      standIn(`Fallback wide ${weight}`, local(heavy ? ['DejaVu Sans Bold', 'DejaVuSans-Bold'] : ['DejaVu Sans', 'DejaVuSans']), wide),
  )
  .join('');
