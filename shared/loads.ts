/** The big loads of a dwelling load calculation, as a homeowner names them. Ratings live in pricing, not here. */
export type LoadAmount = 'none' | 'tons' | 'kilowatts' | 'count' | 'amps';

export interface LoadKind {
  readonly id: string;
  readonly title: string;
  /** What the homeowner may add when it is there; 'none' means that the typical rating is used. */
  readonly amount: LoadAmount;
  readonly amountLabel?: string;
  readonly amountHint?: string;
  readonly min?: number;
  readonly max?: number;
  readonly hint?: string;
}

export const loadKinds = [
  { id: 'range', title: 'Range, oven', amount: 'none' },
  { id: 'dryer', title: 'Clothes dryer', amount: 'none' },
  { id: 'centralAir', title: 'Central air', amount: 'tons', amountLabel: 'Central air, size', amountHint: 'Tons are on the outdoor unit’s label.', min: 1, max: 10 },
  { id: 'waterHeater', title: 'Water heater', amount: 'none' },
  { id: 'heatPump', title: 'Heat pump', amount: 'tons', amountLabel: 'Heat pump, size', amountHint: 'Tons are on the outdoor unit’s label.', min: 1, max: 10 },
  { id: 'stripHeat', title: 'Electric heat', amount: 'kilowatts', amountLabel: 'Electric furnace or strips', amountHint: 'Kilowatts are on the air handler’s label.', min: 2, max: 40 },
  { id: 'roomHeaters', title: 'Room heaters', amount: 'count', amountLabel: 'How many room heaters?', amountHint: 'Baseboard or wall heaters, each with its own dial.', min: 1, max: 20 },
  { id: 'spa', title: 'Hot tub', amount: 'none' },
  { id: 'otherCharger', title: 'Another charger', amount: 'amps', amountLabel: 'The other charger’s setting', amountHint: 'Amps it charges at.', min: 6, max: 80 },
  { id: 'poolPump', title: 'Pool pump', amount: 'none' },
  { id: 'instantWaterHeater', title: 'Instant water heater', amount: 'kilowatts', amountLabel: 'Instant water heater', amountHint: 'Kilowatts are on its label.', min: 3, max: 36 },
  { id: 'workshop', title: 'Welder, kiln', amount: 'kilowatts', amountLabel: 'Workshop machine', amountHint: 'Kilowatts on its plate.', min: 1, max: 30 },
  { id: 'wallOven', title: 'Separate wall oven', amount: 'none' },
  { id: 'cooktop', title: 'Separate cooktop', amount: 'none' },
  { id: 'dishwasher', title: 'Dishwasher', amount: 'none' },
  { id: 'disposal', title: 'Sink disposal', amount: 'none' },
  { id: 'microwave', title: 'Built-in microwave', amount: 'none' },
  { id: 'wellPump', title: 'Well pump', amount: 'none' },
  { id: 'sumpPump', title: 'Sump pump', amount: 'none' },
] as const satisfies readonly LoadKind[];

export type LoadId = (typeof loadKinds)[number]['id'];
export const loadIds = loadKinds.map((kind) => kind.id) as [LoadId, ...LoadId[]];
