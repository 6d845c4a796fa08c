import type { PriceBook } from '../schema';

const priced = (words: string, unit: string, cents: number) => ({ words, unit, cents });
const each = (words: string, cents: number) => priced(words, 'each', cents);

/** Cents a foot by AWG, single copper conductors. */
const wireCents: Record<string, number> = { '14': 16, '12': 22, '10': 36, '8': 60, '6': 92, '4': 145, '3': 182, '2': 228, '1': 310 };
/** Cents a foot of cable with ground: two conductors, and three for an outlet. */
const cableCents: Record<string, readonly [number, number]> = {
  '14': [44, 62],
  '12': [62, 88],
  '10': [98, 138],
  '8': [165, 225],
  '6': [255, 340],
  '4': [395, 525],
  '3': [480, 640],
  '2': [560, 740],
};
/** Cents by trade size: a 10 ft stick, a coupling, a connector, a covered elbow, a strap, a bushing. */
type PipePrices = readonly [stick: number, coupling: number, connector: number, elbow: number, strap: number];
const emt: Record<string, PipePrices> = {
  '1/2': [720, 95, 95, 620, 45],
  '3/4': [1_180, 135, 140, 780, 60],
  '1': [1_890, 210, 220, 1_090, 85],
  '1-1/4': [2_750, 340, 380, 1_590, 110],
  '1-1/2': [3_300, 420, 470, 2_190, 130],
  '2': [4_100, 520, 590, 2_890, 160],
};
const pvc40: Record<string, PipePrices> = {
  '1/2': [520, 60, 70, 480, 50],
  '3/4': [680, 70, 90, 590, 60],
  '1': [980, 95, 130, 790, 75],
  '1-1/4': [1_340, 140, 190, 1_180, 95],
  '1-1/2': [1_620, 170, 230, 1_480, 110],
  '2': [2_150, 230, 310, 1_990, 140],
};
const pvc80: Record<string, number> = { '1/2': 740, '3/4': 960, '1': 1_390, '1-1/4': 1_890, '1-1/2': 2_290, '2': 2_990 };
/** Two-pole breakers by amps, plain and with ground-fault protection. */
const breakers: Record<string, readonly [number, number]> = {
  '20': [1_700, 8_500],
  '25': [1_900, 8_800],
  '30': [1_700, 8_500],
  '35': [1_900, 8_900],
  '40': [1_800, 8_800],
  '45': [1_900, 9_200],
  '50': [1_900, 9_500],
  '60': [2_100, 10_900],
  '80': [5_900, 18_500],
  '100': [7_200, 21_000],
};

type Entry = [string, PriceBook[string]];
type Entries = Entry[];
const bySize = <Value>(table: Record<string, Value>, make: (size: string, value: Value) => Entries): Entries =>
  Object.entries(table).flatMap(([size, value]) => make(size, value));

const pipe = (key: string, fitting: string, words: string, table: Record<string, PipePrices>): Entries =>
  bySize(table, (size, [stick, coupling, connector, elbow, strap]) => [
    [`${key}.${size}`, priced(`${size} in. ${words}`, '10 ft stick', stick)],
    [`fitting.${fitting}.coupling.${size}`, each(`${size} in. coupling`, coupling)],
    [`fitting.${fitting}.connector.${size}`, each(`${size} in. connector`, connector)],
    [`fitting.${fitting}.lb.${size}`, each(`${size} in. covered elbow`, elbow)],
    [`strap.${fitting}.${size}`, each(`${size} in. strap`, strap)],
  ]);

/** What one unit costs us, before markup. Every price is invented for the demo. */
export const priceBook: PriceBook = Object.fromEntries<PriceBook[string]>([
  ...bySize(wireCents, (awg, cents) => [[`wire.thhn.cu.${awg}`, priced(`${awg} AWG copper`, 'ft', cents)]]),
  ...bySize(cableCents, (awg, [two, three]) => [
    [`cable.nmb.${awg}-2`, priced(`${awg}-2 NM-B cable with ground`, 'ft', two)],
    [`cable.nmb.${awg}-3`, priced(`${awg}-3 NM-B cable with ground`, 'ft', three)],
  ]),
  ...pipe('emt', 'emt', 'EMT', emt),
  ...pipe('pvc40', 'pvc', 'PVC pipe', pvc40),
  ...bySize(pvc80, (size, stick) => [[`pvc80.${size}`, priced(`${size} in. heavy PVC pipe`, '10 ft stick', stick)]]),
  ...Object.keys(emt).map((size): Entry => [`bushing.${size}`, each(`${size} in. bushing`, 65)]),
  ...bySize(breakers, (amps, [plain, gfci]) => [
    [`breaker.${amps}`, each(`${amps} A two-pole breaker`, plain)],
    [`breaker.gfci.${amps}`, each(`${amps} A two-pole breaker, ground-fault`, gfci)],
  ]),
  ['strap.nm', each('Cable staple', 12)],
  ['fitting.nm.connector', each('Cable connector', 120)],
  ['box.pull', each('Pull box', 1_450)],
  ['seal.wall', each('Sealant for a hole', 450)],
  ['patch.kit', each('Drywall and compound', 1_150)],
  ['paint.pipe', each('Paint to match', 2_400)],
  ['disconnect.100', each('100 A switch by the charger', 11_500)],
  ['receptacle.14-50', each('14-50 outlet made for cars', 4_900)],
  ['charger.48', each('48 A wall charger, 18 ft cable', 49_500)],
  ['sharing.kit', each('Tap box, whip and link for a second charger', 9_500)],
  ['receptacle.box', each('Outlet box and cover', 1_350)],
  ['receptacle.box.outdoor', each('Outlet box with an in-use cover', 3_450)],
  ['mounting.wood', each('Mounting board and screws', 1_400)],
  ['mounting.masonry', each('Masonry anchors', 900)],
  ['label.set', each('Labels and directory card', 0)],
  ['panel.tandem', each('Slim breaker, two in one space', 2_400)],
  ['panel.sub_panel', each('Small sub-panel with its breaker and wire', 36_000)],
  ['panel.load_manager', each('Load manager with current sensors', 55_000)],
  ['panel.service_overhead', each('200 A panel, meter base, mast and wire', 145_000)],
  ['panel.service_underground', each('200 A panel, meter base and wire', 185_000)],
]);
