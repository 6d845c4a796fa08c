import { z } from './zod';
import { loadIds } from './loads';

/**
 * The facts of a job: what the computation reads. `null` everywhere means "nobody knows yet": it is sampled from the
 * rulebook's likelihoods and widens the range. Lengths in feet, heights in inches, current in amps, unless named otherwise.
 */
export const homeKinds = ['house', 'town_house', 'flat', 'mobile_home'] as const;
export const tenures = ['own', 'rent_with_consent', 'rent'] as const;
export const parkings = ['attached_garage', 'detached_garage', 'carport', 'driveway'] as const;
export const builtPeriods = ['before_1965', '1965_1989', '1990_2009', '2010_or_later'] as const;
export const mainBreakerRatings = [60, 70, 100, 125, 150, 175, 200, 225, 320, 400] as const;
export const panelPlaces = ['garage_wall', 'next_room', 'elsewhere', 'outside', 'basement'] as const;
export const panelConditions = ['fuses', 'rust_or_water', 'warm', 'buzzing', 'scorch', 'screwed_shut'] as const;
export const walls = ['back', 'right', 'front', 'left'] as const;
export const wallFinishes = ['bare_studs', 'drywall', 'masonry'] as const;
export const portCorners = ['front_left', 'front_right', 'rear_left', 'rear_right'] as const;
export const surfaces = ['soil', 'gravel', 'paved'] as const;

export type Wall = (typeof walls)[number];
export type PortCorner = (typeof portCorners)[number];

const loadFactSchema = z.object({
  /** true: it is there and electric. */
  present: z.boolean().nullable(),
  /** In the load kind's own unit (shared/loads.ts); null: the typical rating. */
  amount: z.number().positive().nullable(),
});

const wallSchema = z.enum(walls);
/** `alongFt`: from the left corner on the back and front walls, from the back wall on the left and right walls. */
const openingSchema = z.object({ wall: wallSchema, alongFt: z.number().min(0).max(60), widthFt: z.number().min(1).max(30) });

export const factsSchema = z.object({
  zip: z.string().regex(/^\d{5}$/).nullable(),
  homeKind: z.enum(homeKinds).nullable(),
  tenure: z.enum(tenures).nullable(),
  parking: z.enum(parkings).nullable(),
  yearBuilt: z.enum(builtPeriods).nullable(),
  floorAreaFt2: z.number().min(300).max(8000).nullable(),

  carMaxAmps: z.number().min(6).max(80).nullable(),
  milesPerDay: z.number().min(1).max(300).nullable(),
  hoursHome: z.number().min(3).max(24).nullable(),
  whPerMile: z.number().min(200).max(600).nullable(),
  secondCar: z.enum(['no', 'maybe', 'yes']).nullable(),
  chargerSupply: z.enum(['ours', 'theirs']).nullable(),
  chargerMaxAmps: z.number().min(16).max(80).nullable(),
  chargerConnection: z.enum(['wired', 'plug_in']).nullable(),
  cableLengthFt: z.number().min(12).max(25).nullable(),

  /** 0: no main breaker can be seen. */
  mainBreakerAmps: z.union([z.literal(0), z.literal(mainBreakerRatings)]).nullable(),
  busRatingAmps: z.number().min(100).max(400).nullable(),
  /** Blank spaces side by side; 2 stands for two or more. */
  blankSpaces: z.union([z.literal(0), z.literal(1), z.literal(2)]).nullable(),
  panelPlace: z.enum(panelPlaces).nullable(),
  panelMount: z.enum(['flush', 'surface']).nullable(),
  serviceDrop: z.enum(['overhead', 'underground']).nullable(),
  /** Breaker amps of solar that feeds this panel; 0: none. */
  solarAmps: z.number().min(0).max(200).nullable(),
  /** Empty: nothing odd. */
  panelCondition: z.array(z.enum(panelConditions)).nullable(),
  /** Set by the estimator only. */
  legacyPanel: z.boolean(),
  volts: z.union([z.literal(240), z.literal(208)]),

  loads: z.record(z.enum(loadIds), loadFactSchema),

  room: z.object({ widthFt: z.number().min(8).max(60), depthFt: z.number().min(8).max(60) }).nullable(),
  ceilingFt: z.number().min(7).max(16).nullable(),
  wallFinish: z.enum(wallFinishes).nullable(),
  atticAbove: z.boolean().nullable(),
  crawlBelow: z.boolean().nullable(),
  /** Width of the garage door, on the front wall, `alongFt` from the left corner. */
  garageDoor: z.object({ alongFt: z.number().min(0).max(60), widthFt: z.number().min(6).max(30) }).nullable(),
  /** Doors and windows that a surface run must go round or over. */
  openings: z.array(openingSchema).max(8),
  /** Where the panel is, when it is on a wall of the garage. */
  panelAt: z.object({ wall: wallSchema, alongFt: z.number().min(0).max(60), topIn: z.number().min(36).max(90) }).nullable(),
  chargerAt: z.object({ wall: wallSchema, alongFt: z.number().min(0).max(60), heightIn: z.number().min(18).max(60) }).nullable(),
  carAt: z.object({ centerXFt: z.number().min(0).max(60), parked: z.enum(['nose_in', 'back_in']), portCorner: z.enum(portCorners) }).nullable(),
  /** Steps of 2.5 ft from the garage (or the charger's place outdoors) to the panel, when it is not on a garage wall. */
  pacesToPanel: z.number().int().min(1).max(80).nullable(),
  floorsBetween: z.number().int().min(0).max(3).nullable(),
  trenchFt: z.number().min(1).max(150).nullable(),
  surfaceOver: z.enum(surfaces).nullable(),
  runLook: z.enum(['pipe', 'hidden']).nullable(),
  paintRun: z.boolean().nullable(),
});

export type Facts = z.infer<typeof factsSchema>;
export type FactName = keyof Facts | `loads.${(typeof loadIds)[number]}`;

export const factSources = ['homeowner', 'photo', 'usage', 'estimator', 'assumed'] as const;
export type FactSource = (typeof factSources)[number];

/** Facts of which nothing is known; what an intake starts from. */
export function unknownFacts(): Facts {
  return {
    zip: null, homeKind: null, tenure: null, parking: null, yearBuilt: null, floorAreaFt2: null,
    carMaxAmps: null, milesPerDay: null, hoursHome: null, whPerMile: null, secondCar: null,
    chargerSupply: null, chargerMaxAmps: null, chargerConnection: null, cableLengthFt: null,
    mainBreakerAmps: null, busRatingAmps: null, blankSpaces: null, panelPlace: null, panelMount: null, serviceDrop: null,
    solarAmps: null, panelCondition: null, legacyPanel: false, volts: 240,
    loads: Object.fromEntries(loadIds.map((id) => [id, { present: null, amount: null }])) as Facts['loads'],
    room: null, ceilingFt: null, wallFinish: null, atticAbove: null, crawlBelow: null, garageDoor: null, openings: [],
    panelAt: null, chargerAt: null, carAt: null, pacesToPanel: null, floorsBetween: null, trenchFt: null, surfaceOver: null,
    runLook: null, paintRun: null,
  };
}
