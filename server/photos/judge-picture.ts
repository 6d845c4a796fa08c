import sharp from 'sharp';
import type { Photo } from '../../shared/api/intakes';

/** A hint is worth giving below these. Found by trying drawn and degraded pictures: common practice, no source. */
const DARK_BELOW = 45;
const BLURRED_BELOW = 30;
const SMALL_BELOW_PX = 600;
const JUDGED_WIDTH_PX = 640;

/** Mean brightness (0 to 255) and the variance of the Laplacian, which is high where edges are sharp. `pixels`: gray, row by row. */
export function measure(pixels: Uint8Array, width: number, height: number): { mean: number; sharpness: number } {
  let sum = 0;
  for (const value of pixels) sum += value;
  let [edges, squares, count] = [0, 0, 0];
  for (let y = 1; y < height - 1; y += 1) {
    for (let x = 1; x < width - 1; x += 1) {
      const at = y * width + x;
      const around = (pixels[at - 1] ?? 0) + (pixels[at + 1] ?? 0) + (pixels[at - width] ?? 0) + (pixels[at + width] ?? 0);
      const laplacian = 4 * (pixels[at] ?? 0) - around;
      edges += laplacian;
      squares += laplacian * laplacian;
      count += 1;
    }
  }
  const average = count === 0 ? 0 : edges / count;
  return { mean: pixels.length === 0 ? 0 : sum / pixels.length, sharpness: count === 0 ? 0 : squares / count - average * average };
}

/** Says whether another try is worth it. `picture` is upright; the sizes are those of the picture as it came. */
export async function judgePicture(picture: Buffer, widthPx: number, heightPx: number): Promise<Photo['verdict']> {
  const gray = sharp(picture).resize({ width: JUDGED_WIDTH_PX, withoutEnlargement: true }).grayscale();
  const { data, info } = await gray.raw().toBuffer({ resolveWithObject: true });
  const { mean, sharpness } = measure(data, info.width, info.height);
  if (mean < DARK_BELOW) return 'dark';
  if (Math.min(widthPx, heightPx) < SMALL_BELOW_PX) return 'small';
  return sharpness < BLURRED_BELOW ? 'blurred' : 'good';
}
