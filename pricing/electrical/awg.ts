/** Conductor sizes from smallest to largest; 250 is in kcmil. */
export const awgSizes = ['14', '12', '10', '8', '6', '4', '3', '2', '1', '1/0', '2/0', '3/0', '4/0', '250'] as const;
export type Awg = (typeof awgSizes)[number];
export type Material = 'Cu' | 'Al';

/**
 * Area in circular mils. NEC 2020 and 2023 Chapter 9 Table 8; 3/0 and 4/0 from memory, 250 by its name.
 */
export const circularMils: Readonly<Record<Awg, number>> = {
  14: 4_110, 12: 6_530, 10: 10_380, 8: 16_510, 6: 26_240, 4: 41_740, 3: 52_620, 2: 66_360, 1: 83_690,
  '1/0': 105_600, '2/0': 133_100, '3/0': 167_800, '4/0': 211_600, 250: 250_000,
};

const order = new Map<Awg, number>(awgSizes.map((awg, index) => [awg, index]));

/** Negative when `a` is thinner than `b`, 0 when they are the same. */
export const compareAwg = (a: Awg, b: Awg): number => (order.get(a) ?? 0) - (order.get(b) ?? 0);
