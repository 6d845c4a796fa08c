/**
 * Makes assets/fonts/Nunito_*.woff2 from the whole fonts of @expo-google-fonts/nunito: Latin-1 and the few signs that the
 * product's words use. Run by hand when a sign is missing (`node server/cli/subset-fonts.mjs`); the results are committed.
 */
import { mkdir, readFile, writeFile } from 'node:fs/promises';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import subsetFont from 'subset-font';

const root = join(dirname(fileURLToPath(import.meta.url)), '..', '..');
const weights = ['400Regular', '500Medium', '600SemiBold', '700Bold', '800ExtraBold'];

/**
 * The characters from one code point to another, both included.
 * @param {number} from
 * @param {number} to
 */
const characters = (from, to) => String.fromCodePoint(...Array.from({ length: to - from + 1 }, (_, index) => from + index));

// Dashes, quotes, ellipsis, bullet, minus, prime and double prime (feet and inches), narrow no-break space, and the zero-width
// signs that browsers look for; 1/3 and 2/3 beside Latin-1's own quarters and halves.
const extraSigns = '–—‘’‚“”„…•−′″\u2009\u202F\u200B\u2060⅓⅔≤≥≈×÷';
const wanted = characters(0x20, 0x7e) + characters(0xa0, 0xff) + extraSigns;

const target = join(root, 'assets', 'fonts');
await mkdir(target, { recursive: true });
for (const weight of weights) {
  const whole = await readFile(join(root, 'node_modules', '@expo-google-fonts', 'nunito', weight, `Nunito_${weight}.ttf`));
  const subset = await subsetFont(whole, wanted, { targetFormat: 'woff2' });
  await writeFile(join(target, `Nunito_${weight}.woff2`), subset);
  console.log(`Nunito_${weight}.woff2  ${(subset.length / 1024).toFixed(1)} KB`);
}
