import regular from '../../assets/fonts/Nunito_400Regular.woff2';
import medium from '../../assets/fonts/Nunito_500Medium.woff2';
import semiBold from '../../assets/fonts/Nunito_600SemiBold.woff2';
import bold from '../../assets/fonts/Nunito_700Bold.woff2';
import extraBold from '../../assets/fonts/Nunito_800ExtraBold.woff2';

/** The addresses of the font files, by weight. */
export const fontFiles = { 400: regular, 500: medium, 600: semiBold, 700: bold, 800: extraBold } as const;
