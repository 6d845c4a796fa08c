import sharp from 'sharp';

/** Noise with an even mean: bright enough and, unlike a flat color, as sharp as a picture can be. */
const noise = (widthPx: number, heightPx: number) =>
  sharp({ create: { width: widthPx, height: heightPx, channels: 3, background: '#808080', noise: { type: 'gaussian', mean: 150, sigma: 40 } } });

/** A photo as a phone takes it: a JPEG that says with which camera and where it was taken (a place in the sea). */
export function phonePhoto(): Promise<Buffer> {
  return noise(1_600, 1_200)
    .jpeg({ quality: 80 })
    .withExif({
      IFD0: { Make: 'Demo', Model: 'Demo phone', Copyright: 'nobody' },
      IFD3: { GPSLatitudeRef: 'N', GPSLatitude: '10/1 30/1 0/1', GPSLongitudeRef: 'W', GPSLongitude: '40/1 15/1 0/1' },
    })
    .toBuffer();
}

/** Words under a picture's name. */
export const fakePicture = (): Buffer => Buffer.from('This is a letter, not a picture.\n'.repeat(200));

/** 30 MB that begin like a picture, more than a photo may have. */
export const hugePicture = (): Buffer => Buffer.concat([Buffer.from('ffd8ffe000104a464946', 'hex'), Buffer.alloc(30 * 1024 * 1024, 7)]);
