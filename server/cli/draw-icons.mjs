/** Makes assets/icon.png and assets/favicon.png from assets/brand-mark.svg. Run by hand after a change of the mark. */
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import sharp from 'sharp';

const assets = join(dirname(fileURLToPath(import.meta.url)), '..', '..', 'assets');
const sizesPx = { 'icon.png': 512, 'favicon.png': 64 };
for (const [file, sizePx] of Object.entries(sizesPx)) {
  await sharp(join(assets, 'brand-mark.svg'), { density: 600 }).resize(sizePx, sizePx).png({ compressionLevel: 9 }).toFile(join(assets, file));
}
