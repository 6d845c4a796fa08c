import { family, type Weight } from './fonts';

/** Every colour of the house by its role; contrast of each pair in use is measured (WCAG 2.2). */
export const colors = {
  paper: '#F5EFE2', card: '#FFFCF5', well: '#ECE4D3', rule: '#DACFB9', edge: '#857A66',
  ink: '#12302A', ink2: '#3F5A53', ink3: '#526862',
  spruce: '#1C473E', spruceDeep: '#133730', spruceWash: '#DCE8DF', mist: '#B9CFC5', edgeDark: '#7FA296',
  copper: '#A2481A', copperDeep: '#7E3610', live: '#C56D33', copperWash: '#FAE6D6', copperPale: '#F3B183',
  lake: '#2B5B7A', lakeWash: '#DDE9EF',
  ok: '#2A6836', okWash: '#DDEBD5', warn: '#765300', warnWash: '#FBEBBF', stop: '#A1272B', stopWash: '#FADFDA',
  blade: '#F8E6AE', focus: '#2B5B7A', focusDark: '#F8E6AE', white: '#FFFFFF', liveDark: '#E3935B',
  sage: '#D3E1D6', planCar: '#C9DBE4', planGrid: '#E3EBEA', planGrid5: '#C3D5DA', breakerOff: '#2B574D',
  elevation: '#E4ECE4', hazard: '#E2B23A',
} as const;
export type ColorName = keyof typeof colors;

/** Distances in px: `space[4]` is 16. */
export const space = [0, 4, 8, 12, 16, 20, 24, 32, 40, 56, 72] as const;

export const radius = { plate: 6, tag: 8, small: 12, field: 14, button: 16, card: 20, sheet: 24, picture: 32 } as const;

export const border = { hair: 1, control: 1.5, quiet: 2, chosen: 2.5, head: 2 } as const;

/** Where a layout begins, px of the window's width. */
export const breakpoints = { tablet: 720, wide: 1120 } as const;
export type Breakpoint = 'phone' | 'tablet' | 'wide';

/** Durations in ms; none of them with reduced motion. */
export const motion = { press: 90, handle: 140, tapePause: 120, tape: 520, run: 600, sheetIn: 220, sheetOut: 160, toast: 160 } as const;

export const shadow = {
  dock: '0 -8px 24px rgba(18,48,42,0.08)',
  sheet: '0 16px 40px rgba(18,48,42,0.22)',
} as const;

/** The smallest side of anything that is pressed, px. */
export const targetPx = 44;

interface TypeStyle { readonly size: number; readonly line: number; readonly weight: Weight; readonly spacingEm?: number }
export interface TypeScale extends TypeStyle { readonly wide?: Omit<TypeStyle, 'weight'> }

/** The type scale: sizes and line heights in px on a phone, and from `breakpoints.wide` where they differ. */
export const type = {
  display: { size: 28, line: 34, weight: 800, wide: { size: 52, line: 57, spacingEm: -0.02 } },
  price: { size: 37, line: 46, weight: 800, spacingEm: -0.015, wide: { size: 46, line: 54, spacingEm: -0.02 } },
  title: { size: 24, line: 30, weight: 800, wide: { size: 34, line: 42 } },
  deskTitle: { size: 26, line: 34, weight: 800 },
  heading: { size: 20, line: 26, weight: 800 },
  subheading: { size: 17, line: 24, weight: 800 },
  figure: { size: 22, line: 28, weight: 800, wide: { size: 28, line: 40 } },
  body: { size: 16, line: 24, weight: 500 },
  action: { size: 17, line: 24, weight: 800 },
  note: { size: 14, line: 20, weight: 600 },
  fine: { size: 13, line: 18, weight: 600 },
  plate: { size: 12, line: 24, weight: 800, spacingEm: 0.07 },
} as const satisfies Record<string, TypeScale>;
export type TextVariant = keyof typeof type;

/** A text style for React Native: the family is chosen by weight, never by `fontWeight` on one family. */
export const typeStyle = (variant: TextVariant, weight?: Weight) => {
  const style: TypeScale = type[variant];
  return {
    fontFamily: family[weight ?? style.weight],
    fontSize: style.size,
    lineHeight: style.line,
    ...(style.spacingEm === undefined ? {} : { letterSpacing: style.size * style.spacingEm }),
  };
};
