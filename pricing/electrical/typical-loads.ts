import type { LoadId } from '../../shared/loads';

/** Volts of the ratings below. */
const PLATE_VOLTS = 240;

/** VA of one unit of a load (a ton, a kilowatt, a heater, an amp at 240 V), and the amount when nobody says. */
interface Typical { readonly unitVa: number; readonly amount: number }

/**
 * Ratings where the plate is not known. Common practice, no source; the amounts for machines without a plate are invented for the demo.
 * A dryer counts its plate or 5,000 VA, the larger (NEC 2020 and 2023 220.54).
 */
const typical: Readonly<Record<LoadId, Typical>> = {
  range: { unitVa: 12_000, amount: 1 },
  wallOven: { unitVa: 4500, amount: 1 },
  cooktop: { unitVa: 5000, amount: 1 },
  dryer: { unitVa: 5000, amount: 1 },
  waterHeater: { unitVa: 4500, amount: 1 },
  instantWaterHeater: { unitVa: 1000, amount: 18 },
  dishwasher: { unitVa: 1200, amount: 1 },
  disposal: { unitVa: 800, amount: 1 },
  microwave: { unitVa: 1500, amount: 1 },
  centralAir: { unitVa: 1300, amount: 3 },
  heatPump: { unitVa: 1300, amount: 3 },
  stripHeat: { unitVa: 1000, amount: 10 },
  roomHeaters: { unitVa: 1500, amount: 4 },
  poolPump: { unitVa: 1800, amount: 1 },
  spa: { unitVa: 9600, amount: 1 },
  wellPump: { unitVa: 1500, amount: 1 },
  sumpPump: { unitVa: 800, amount: 1 },
  otherCharger: { unitVa: 240, amount: 32 },
  workshop: { unitVa: 1000, amount: 5 },
};

/**
 * Rated VA of a load by its amount (tons, kilowatts, count, amps); the usual amount when it is null. A charger takes its amps at the
 * supply's volts; the plates of the others are those of 240 V, which is the cautious side at 208 V.
 */
export const typicalLoadVa = (id: LoadId, amount: number | null, volts = PLATE_VOLTS): number =>
  typical[id].unitVa * (amount ?? typical[id].amount) * (id === 'otherCharger' ? volts / PLATE_VOLTS : 1);
