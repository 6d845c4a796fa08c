import { existsSync, readdirSync } from 'node:fs';
import { join } from 'node:path';
import sharp, { type Sharp } from 'sharp';
import { MAX_PHOTOS } from '../../../server/photos/add-photo';
import { hashPassword } from '../../../server/auth/passwords';
import type { Photo } from '../../../shared/api/intakes';
import { startTestApp, type Agent, type TestApp } from '../../support/app';
import { expectProblem } from '../../support/problem';

let server: TestApp;
beforeAll(async () => { server = await startTestApp(); });
afterAll(() => server.stop());

const start = async (): Promise<Agent> => {
  const browser = server.browser();
  await browser.post('/api/intakes').expect(200);
  return browser;
};
/** A picture with detail, so that it is neither dark nor blurred. */
const noise = (width: number, height: number) => sharp({ create: { width, height, channels: 3, background: '#888888', noise: { type: 'gaussian', mean: 140, sigma: 60 } } });
const send = (browser: Agent, bytes: Buffer, slot = 'panel', name = 'photo.jpg') => browser.post('/api/intakes/current/photos').field('slot', slot).attach('photo', bytes, name);
const stored = () => {
  const folder = join(server.deps.env.STORAGE_DIR, 'photos');
  return existsSync(folder) ? readdirSync(folder, { recursive: true }).map(String).filter((name) => name.endsWith('.jpg')) : [];
};

describe('refused', () => {
  let browser: Agent;
  let before: string[];
  beforeAll(async () => { browser = await start(); before = stored(); });
  afterAll(() => { expect(stored()).toEqual(before); });

  it('without an intake', async () => {
    expectProblem(await send(server.browser(), Buffer.from('x')), 'not-found');
  });

  it('without a picture, without a form, into a place that does not exist, and two at once', async () => {
    const picture = await noise(700, 700).jpeg().toBuffer();
    expectProblem(await browser.post('/api/intakes/current/photos').field('slot', 'panel'), 'malformed');
    expectProblem(await browser.post('/api/intakes/current/photos').send({ slot: 'panel' }), 'malformed');
    expect(expectProblem(await send(browser, picture, 'roof'), 'validation')).toEqual(['/slot']);
    expectProblem(await send(browser, picture).attach('photo', picture, 'b.jpg'), 'malformed');
    expectProblem(await browser.post('/api/intakes/current/photos').set('Content-Type', 'multipart/form-data; boundary=x').send('--x\r\nContent-Disposition: form-data; name="photo'), 'malformed');
  });

  it('30 MB', async () => {
    expectProblem(await send(browser, Buffer.concat([await noise(64, 64).jpeg().toBuffer(), Buffer.alloc(30 * 1024 * 1024)])), 'too-large');
  });

  const png = (width: number, height: number) => {
    // The signature and a header that claims a size; PNG specification (third edition), 5.2 and 11.2.1.
    const bytes = Buffer.from('89504e470d0a1a0a0000000d49484452000000000000000008060000000000000000', 'hex');
    bytes.writeUInt32BE(width, 16);
    bytes.writeUInt32BE(height, 20);
    return bytes;
  };
  it.each<[string, () => Buffer | Promise<Buffer>]>([
    ['text with a picture’s name', () => Buffer.from('hello')],
    ['nothing', () => Buffer.alloc(0)],
    ['a page', () => Buffer.from('<!doctype html><script>alert(1)</script>')],
    ['an SVG with a script', () => Buffer.from('<svg xmlns="http://www.w3.org/2000/svg"><script>alert(1)</script></svg>')],
    ['a PDF', () => Buffer.from('%PDF-1.7\n1 0 obj')],
    ['an archive', () => Buffer.from('504b0304', 'hex')],
    ['a GIF', () => sharp({ create: { width: 20, height: 20, channels: 3, background: '#888' } }).gif().toBuffer()],
    ['a TIFF', () => noise(70, 70).tiff().toBuffer()],
    ['a HEIC by its first bytes', () => Buffer.from('\u0000\u0000\u0000\u0018ftypheic\u0000\u0000\u0000\u0000mif1heic', 'latin1')],
    ['a JPEG of three bytes', () => Buffer.from('ffd8ff', 'hex')],
    ['a JPEG cut in the middle', async () => { const whole = await noise(1200, 900).jpeg().toBuffer(); return whole.subarray(0, whole.length / 2); }],
    ['a PNG without pixels', () => png(0, 0)],
  ])('%s: not a picture we can read', async (_name, bytes) => {
    expectProblem(await send(browser, await bytes()), 'unsupported-media');
  });

  it('a HEIC is told so in clear words', async () => {
    const response = await send(browser, Buffer.from('\u0000\u0000\u0000\u0018ftypheic\u0000\u0000\u0000\u0000mif1heic', 'latin1'));
    expect(response.text).toContain('HEIC');
  });

  it('a picture that unpacks to more than 50 million pixels', async () => {
    const bomb = await sharp({ create: { width: 8000, height: 7000, channels: 3, background: '#fff' } }).png({ compressionLevel: 9 }).toBuffer();
    expect(bomb.length).toBeLessThan(1_000_000);
    expectProblem(await send(browser, bomb), 'too-large');
  });
});

describe('kept', () => {
  it('as an upright JPEG without a place, a device or anything else that was in the file', async () => {
    const browser = await start();
    const original = await noise(1600, 1200).withExif({ IFD0: { Make: 'Somebody', Copyright: 'secret-words' }, IFD3: { GPSLatitudeRef: 'N', GPSLatitude: '51/1 30/1 0/1' } })
      .withMetadata({ orientation: 6 }).jpeg().toBuffer();
    expect((await sharp(original).metadata()).exif).toBeDefined();
    const { body, status } = await send(browser, original, 'label', '../../etc/pass<wd>.jpg');
    expect(status).toBe(201);
    const photo = body as Photo;
    // Orientation 6 is a quarter turn (EXIF 2.32, tag 274): width and height change places.
    expect(photo).toMatchObject({ slot: 'label', widthPx: 1200, heightPx: 1600, verdict: 'good', url: `/api/photos/${photo.id}/full`, thumbUrl: `/api/photos/${photo.id}/thumb` });
    for (const [url, longest] of [[photo.url, 1600], [photo.thumbUrl, 480]] as const) {
      const response = await browser.get(url).buffer(true).expect(200);
      expect(response.headers).toMatchObject({ 'content-type': 'image/jpeg', 'x-content-type-options': 'nosniff', 'cache-control': 'private, max-age=3600' });
      const picture = await sharp(response.body as Buffer).metadata();
      expect(picture).toMatchObject({ format: 'jpeg', height: longest });
      expect([picture.exif, picture.xmp, picture.iptc, picture.orientation]).toEqual([undefined, undefined, undefined, undefined]);
      expect((response.body as Buffer).includes('secret-words')).toBe(false);
    }
    expect(stored().filter((name) => name.includes(photo.id)).sort()).toEqual([`${photo.id}/full.jpg`, `${photo.id}/thumb.jpg`]);
    expect((await browser.get('/api/intakes/current')).body).toHaveProperty('photos', [photo]);
  });

  it('a PNG and a WebP as well, by their content and not by their name; at most 2,400 pixels a side', async () => {
    const browser = await start();
    expect((await send(browser, await noise(3000, 1000).png().toBuffer(), 'wall', 'a.heic')).body).toMatchObject({ widthPx: 2400, heightPx: 800 });
    expect((await send(browser, await noise(900, 900).webp().toBuffer(), 'way', 'b.exe')).body).toMatchObject({ widthPx: 900 });
  });

  it('what follows a picture in its file is gone', async () => {
    const browser = await start();
    const { body } = await send(browser, Buffer.concat([await noise(800, 800).jpeg().toBuffer(), Buffer.from('<script>alert(1)</script>PK\u0003\u0004')]));
    const picture = await browser.get((body as Photo).url).buffer(true);
    expect((picture.body as Buffer).includes('<script>')).toBe(false);
  });

  it('with a hint when another try is worth it', async () => {
    const browser = await start();
    const verdictOf = async (picture: Sharp) => {
      const { body } = await send(browser, await picture.jpeg({ quality: 90 }).toBuffer());
      return (body as Photo).verdict;
    };
    expect(await verdictOf(noise(1200, 900))).toBe('good');
    expect(await verdictOf(sharp(await noise(1200, 900).png().toBuffer()).linear(0.15, 0))).toBe('dark');
    expect(await verdictOf(sharp(await noise(1200, 900).png().toBuffer()).blur(12))).toBe('blurred');
    expect(await verdictOf(noise(500, 400))).toBe('small');
  });

  it(`no more than ${MAX_PHOTOS} of one intake; one taken back makes room`, async () => {
    const browser = await start();
    const picture = await noise(640, 640).jpeg().toBuffer();
    const sent = await Promise.all(Array.from({ length: MAX_PHOTOS + 3 }, () => send(browser, picture)));
    expect(sent.filter(({ status }) => status === 201)).toHaveLength(MAX_PHOTOS);
    expectProblem(await send(browser, picture), 'conflict');
    await browser.delete(`/api/intakes/current/photos/${(sent.find(({ status }) => status === 201)?.body as Photo).id}`).expect(204);
    await send(browser, picture).expect(201);
  });
});

describe('who may see one', () => {
  it('its own browser and the desk; to strangers it does not exist; taken back it is gone with its files', async () => {
    const browser = await start();
    const photo = (await send(browser, await noise(700, 700).jpeg().toBuffer())).body as Photo;
    await browser.get(photo.thumbUrl).expect(200);
    expectProblem(await server.browser().get(photo.thumbUrl), 'not-found');
    const stranger = await start();
    expectProblem(await stranger.get(photo.thumbUrl), 'not-found');
    expectProblem(await stranger.delete(`/api/intakes/current/photos/${photo.id}`), 'not-found');
    await server.deps.models.Staff.create({ email: 'sales@example.com', name: 'Rafe Alder', role: 'sales', passwordHash: await hashPassword('a long password') });
    const desk = server.browser();
    await desk.post('/api/session').send({ email: 'sales@example.com', password: 'a long password' }).expect(200);
    await desk.get(photo.url).expect(200);
    await browser.delete(`/api/intakes/current/photos/${photo.id}`).expect(204);
    expectProblem(await browser.get(photo.url), 'not-found');
    expectProblem(await browser.delete(`/api/intakes/current/photos/${photo.id}`), 'not-found');
    expect(stored().some((name) => name.includes(photo.id))).toBe(false);
  });
});
