import { colors, type ColorName } from '../../../components/theme/tokens';

/** Relative luminance: WCAG 2.2, "relative luminance" (sRGB). */
const luminance = (hex: string): number => {
  const [r = 0, g = 0, b = 0] = [1, 3, 5].map((at) => {
    const share = parseInt(hex.slice(at, at + 2), 16) / 255;
    return share <= 0.04045 ? share / 12.92 : ((share + 0.055) / 1.055) ** 2.4;
  });
  return 0.2126 * r + 0.7152 * g + 0.0722 * b;
};
/** WCAG 2.2, "contrast ratio". */
const contrast = (a: string, b: string): number => {
  const [light = 0, dark = 0] = [luminance(a), luminance(b)].sort((x, y) => y - x);
  return (light + 0.05) / (dark + 0.05);
};

// Pairs and ratios as measured in the design's table of tokens; needs: WCAG 2.2 1.4.3 (text 4.5) and 1.4.11 (graphics 3).
const pairs: readonly (readonly [ColorName, ColorName, number, 4.5 | 3])[] = [
  ['ink', 'paper', 12.37, 4.5], ['ink2', 'card', 7.32, 4.5], ['ink3', 'well', 4.72, 4.5], ['edge', 'well', 3.34, 3], ['white', 'copper', 6.04, 4.5],
  ['copper', 'copperWash', 4.99, 4.5], ['live', 'paper', 3.27, 3], ['copperPale', 'spruce', 5.66, 4.5], ['lake', 'lakeWash', 5.89, 4.5], ['ok', 'okWash', 5.4, 4.5],
  ['warn', 'warnWash', 5.9, 4.5], ['stop', 'stopWash', 5.86, 4.5], ['mist', 'breakerOff', 4.97, 4.5], ['blade', 'breakerOff', 6.58, 4.5], ['edgeDark', 'spruce', 3.72, 3],
  ['lake', 'planCar', 5.12, 4.5], ['stop', 'elevation', 6.13, 4.5], ['focus', 'paper', 6.36, 3], ['focusDark', 'spruce', 8.38, 3], ['mist', 'spruce', 6.33, 4.5],
];

test.each(pairs)('%s on %s has the contrast that the design measured', (mark, ground, measured, needed) => {
  expect(contrast(colors[mark], colors[ground])).toBeCloseTo(measured, 1);
  expect(contrast(colors[mark], colors[ground])).toBeGreaterThanOrEqual(needed);
});
