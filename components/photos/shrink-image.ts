/** The longer side after shrinking, px; the server keeps no more. */
export const MAX_SIDE_PX = 2400;
const JPEG_QUALITY = 0.88;

/**
 * Makes a large picture small enough for a phone's connection. A picture that this browser cannot read is handed on as it is:
 * the server says what is wrong with it.
 */
export async function shrinkImage(file: Blob): Promise<Blob> {
  try {
    const bitmap = await createImageBitmap(file, { imageOrientation: 'from-image' });
    const scale = Math.min(1, MAX_SIDE_PX / Math.max(bitmap.width, bitmap.height));
    if (scale === 1 && file.type === 'image/jpeg') return file;
    const canvas = document.createElement('canvas');
    canvas.width = Math.max(1, Math.round(bitmap.width * scale));
    canvas.height = Math.max(1, Math.round(bitmap.height * scale));
    canvas.getContext('2d')?.drawImage(bitmap, 0, 0, canvas.width, canvas.height);
    bitmap.close();
    const small = await new Promise<Blob | null>((done) => canvas.toBlob(done, 'image/jpeg', JPEG_QUALITY));
    return small ?? file;
  } catch {
    return file;
  }
}
