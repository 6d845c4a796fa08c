import { createRequire } from 'node:module';
import sharp, { type OverlayOptions } from 'sharp';

/** Stand-in pictures for the demo, drawn from SVG: no real home, panel or maker is in them. */
export type DrawnPhoto = 'panel' | 'label' | 'wall' | 'way' | 'meter';

const WIDTH = 1600;
const HEIGHT = 1200;

const page = (body: string) => `<svg xmlns="http://www.w3.org/2000/svg" width="${WIDTH}" height="${HEIGHT}" viewBox="0 0 ${WIDTH} ${HEIGHT}">${body}</svg>`;

/** A little grain, so that the picture has the fine detail that a sharp photo has. */
const grain: OverlayOptions = {
  input: { create: { width: WIDTH, height: HEIGHT, channels: 3, background: '#808080', noise: { type: 'gaussian', mean: 128, sigma: 22 } } }, blend: 'soft-light',
};

const breaker = (x: number, y: number, blank: boolean) =>
  blank
    ? `<rect x="${x}" y="${y}" width="170" height="52" rx="4" fill="#9aa3a5" stroke="#7d8789" stroke-width="3"/>`
    : `<rect x="${x}" y="${y}" width="170" height="52" rx="4" fill="#23292b"/><rect x="${x + (x < 800 ? 110 : 16)}" y="${y + 12}" width="44" height="28" rx="3" fill="#e9ece9"/>`;

function panel(blankSpaces: number): string {
  const rows = Array.from({ length: 9 }, (_, row) => [breaker(620, 360 + row * 64, row > 8 - blankSpaces), breaker(810, 360 + row * 64, false)].join('')).join('');
  const lines = Array.from({ length: 9 }, (_, row) => `<path d="M250 ${420 + row * 64} l 220 ${12 + (row % 3) * 3}" stroke="#5a605f" stroke-width="6"/>`).join('');
  return page(`<rect width="1600" height="1200" fill="#c9cbc4"/><path d="M0 640 H1600 M1180 0 V1200" stroke="#b5b8b0" stroke-width="5"/>
    <path d="M190 140 L 530 200 V1040 L190 1110 Z" fill="#d8d5cb" stroke="#6f7674" stroke-width="6"/><path d="M235 370 L490 392 V960 L235 1010 Z" fill="#fbf8ef"/>${lines}
    <rect x="540" y="170" width="520" height="900" rx="16" fill="#8f999b" stroke="#606a6c" stroke-width="8"/><rect x="590" y="220" width="420" height="800" fill="#b9c1c2"/>
    <rect x="690" y="238" width="220" height="100" rx="8" fill="#1d2224"/><rect x="752" y="252" width="96" height="72" rx="6" fill="#f4f4ef"/>${rows}`);
}

const label = () => page(`<rect width="1600" height="1200" fill="#8d9698"/><rect x="300" y="110" width="1000" height="600" rx="26" fill="#1d2224"/>
  <rect x="600" y="190" width="400" height="330" rx="30" fill="#3a4244"/><rect x="640" y="235" width="320" height="210" rx="18" fill="#f4f4ef"/><rect x="200" y="760" width="1200" height="360" fill="#f6f1e2"/>`);

const wall = () => page(`<rect width="1600" height="1200" fill="#cfd1c9"/><rect y="1010" width="1600" height="190" fill="#7d7c76"/><path d="M420 0 V1010 M840 0 V1010 M1260 0 V1010" stroke="#b9bbb2" stroke-width="5"/>
  <rect x="180" width="60" height="1010" fill="#b08d66"/><rect x="960" y="420" width="110" height="190" rx="10" fill="#f5f4ee" stroke="#5d6261" stroke-width="5"/>
  <path d="M1000 470 v36 M1030 470 v36 M1000 540 v36 M1030 540 v36" stroke="#3c4140" stroke-width="8"/><rect x="1290" y="800" width="230" height="210" fill="#a4643c"/><path d="M1290 870 H1520" stroke="#7d4a2b" stroke-width="6"/><rect x="0" y="760" width="150" height="260" fill="#4a6c82"/>`);

const way = () => page(`<rect width="1600" height="1200" fill="#c3c6bf"/><path d="M0 0 L460 260 V840 L0 1200 Z" fill="#b3b7ae"/><path d="M1600 0 L1140 260 V840 L1600 1200 Z" fill="#b8bcb3"/><path d="M0 1200 L460 840 H1140 L1600 1200 Z" fill="#83827b"/>
  <rect x="560" y="380" width="150" height="200" rx="8" fill="#7f898b" stroke="#5d6668" stroke-width="6"/><rect x="880" y="400" width="190" height="440" fill="#e7e2d4" stroke="#8d8a7f" stroke-width="6"/><circle cx="1040" cy="630" r="14" fill="#8a6a2a"/>
  <path d="M600 1000 q10 -150 120 -160 h220 q110 10 120 160 z" fill="#2f5d7c"/><path d="M690 870 q20 -70 70 -75 h140 q50 5 70 75 z" fill="#dfe8ec"/>`);

const meter = () => page(`<rect width="1600" height="1200" fill="#b9a48c"/>${Array.from({ length: 10 }, (_, row) => `<path d="M0 ${row * 120 + 60} H1600" stroke="#a08b73" stroke-width="6"/>`).join('')}
  <rect x="735" y="0" width="130" height="330" fill="#8f9799"/><rect x="560" y="320" width="480" height="640" rx="20" fill="#9fa7a9" stroke="#6d7678" stroke-width="8"/><circle cx="800" cy="600" r="190" fill="#e8ecec" stroke="#5d6668" stroke-width="14"/>
  <rect x="690" y="540" width="220" height="80" fill="#20282a"/><rect x="760" y="960" width="80" height="240" fill="#8f9799"/>`);

// The font comes with the package: a bare machine has none, and SVG text would stay empty there.
const font = createRequire(__filename).resolve('@expo-google-fonts/nunito/800ExtraBold/Nunito_800ExtraBold.ttf');

async function words(text: string, centerX: number, centerY: number, heightPx: number, color: string): Promise<OverlayOptions> {
  const { data, info } = await sharp({ text: { text: `<span foreground="${color}">${text}</span>`, font: 'Nunito', fontfile: font, height: heightPx, width: WIDTH, rgba: true } })
    .png().toBuffer({ resolveWithObject: true });
  return { input: data, left: Math.round(centerX - info.width / 2), top: Math.round(centerY - info.height / 2) };
}

const writing: Partial<Record<DrawnPhoto, (mainAmps: number) => Promise<OverlayOptions>[]>> = {
  panel: (mainAmps) => [words(String(mainAmps), 800, 288, 40, '#1d2224')],
  label: (mainAmps) => [
    words(String(mainAmps), 800, 340, 130, '#15191a'), words('ON', 800, 610, 56, '#e9ece9'),
    words('LOAD CENTER 120/240 V', 760, 840, 54, '#22282a'), words(`MAX ${mainAmps} A 1 PH 3 W`, 690, 940, 54, '#22282a'), words('TYPE 1 ENCLOSURE', 660, 1040, 54, '#22282a'),
  ],
  meter: () => [words('04817', 800, 580, 46, '#cfe6d8')],
};

async function draw(kind: DrawnPhoto, mainAmps: number, blankSpaces: number, fault: PhotoFault | undefined): Promise<Buffer> {
  const svg = { panel: () => panel(blankSpaces), label, wall, way, meter }[kind]();
  const drawn = await sharp(Buffer.from(svg)).composite([...(await Promise.all(writing[kind]?.(mainAmps) ?? [])), grain]).removeAlpha().raw().toBuffer({ resolveWithObject: true });
  let image = sharp(drawn.data, { raw: drawn.info });
  if (fault === 'dark') image = image.linear(0.16, 0);
  if (fault === 'blurred') image = image.blur(14);
  return image.jpeg({ quality: 82 }).toBuffer();
}

export type PhotoFault = 'dark' | 'blurred';
const drawn = new Map<string, Promise<Buffer>>();

/**
 * Draws one stand-in photo; the same one is drawn once.
 * @param mainAmps the number on the main breaker's handle
 * @param fault 'dark' or 'blurred' make the pictures that a person would be asked to take again
 * @returns a JPEG of 1600 x 1200 pixels
 */
export function drawPhoto(kind: DrawnPhoto, mainAmps: number, blankSpaces: number, fault?: PhotoFault): Promise<Buffer> {
  const key = [kind, kind === 'panel' || kind === 'label' ? mainAmps : '', kind === 'panel' ? blankSpaces : '', fault].join();
  const known = drawn.get(key) ?? draw(kind, mainAmps, blankSpaces, fault);
  drawn.set(key, known);
  return known;
}
