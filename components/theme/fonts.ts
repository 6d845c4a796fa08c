export type Weight = 400 | 500 | 600 | 700 | 800;

/** The font family of each weight. */
export const family: Readonly<Record<Weight, string>> = {
  400: 'Nunito_400Regular',
  500: 'Nunito_500Medium',
  600: 'Nunito_600SemiBold',
  700: 'Nunito_700Bold',
  800: 'Nunito_800ExtraBold',
};
