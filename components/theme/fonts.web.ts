import type { Weight } from './fonts';

export type { Weight } from './fonts';

const stack = (name: string, weight: Weight) => `${name}, "Fallback ${weight}", "Fallback wide ${weight}", sans-serif`;

/** The font family of each weight, followed by stand-ins of the same width (see font-faces.ts), so that nothing moves when it arrives. */
export const family: Readonly<Record<Weight, string>> = {
  400: stack('Nunito_400Regular', 400),
  500: stack('Nunito_500Medium', 500),
  600: stack('Nunito_600SemiBold', 600),
  700: stack('Nunito_700Bold', 700),
  800: stack('Nunito_800ExtraBold', 800),
};
