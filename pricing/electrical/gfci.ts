import { clause, type CodeEdition } from './edition';

export interface GfciInput {
  readonly edition: CodeEdition;
  readonly connection: 'wired' | 'plug_in';
  readonly place: 'indoor' | 'outdoor';
  readonly breakerAmps: number;
  readonly voltsToGround: number;
}

export interface GfciDecision { readonly required: boolean; readonly reason: string; readonly clause: string }

/** Outdoor outlets of dwellings come under 210.8(F) up to these, on single-phase circuits. */
const OUTDOOR_UP_TO_AMPS = 50;
const OUTDOOR_UP_TO_VOLTS_TO_GROUND = 150;

const indoorWords = 'A wired charger indoors needs no GFCI breaker; its own protection is part of its listing.';
const reasons = {
  receptacle: 'A receptacle for charging a vehicle has GFCI protection wherever it is.',
  outdoors: 'A wired charger outdoors on a circuit of 50 A or less has GFCI protection.',
  outdoorsAbove: 'Wired outdoors on a circuit above 50 A or 150 V to ground: the rule for outdoor outlets ends there.',
  indoors: indoorWords,
  indoorsAsk: `${indoorWords} Some offices count a garage at or below grade under 210.8(F): ask.`,
} as const;

/**
 * Whether the breaker must be of the GFCI kind, and why. A receptacle for charging always (625.54). A wired charger outdoors up to 50 A
 * and 150 V to ground (210.8(F)); indoors not, though 2023 names garages at or below grade in that clause and offices read it apart.
 * NEC 2020 and 2023.
 */
export function gfciDecision({ edition, connection, place, breakerAmps, voltsToGround }: GfciInput): GfciDecision {
  if (connection === 'plug_in') return { required: true, reason: reasons.receptacle, clause: clause(edition, '625.54') };
  const small = breakerAmps <= OUTDOOR_UP_TO_AMPS && voltsToGround <= OUTDOOR_UP_TO_VOLTS_TO_GROUND;
  const required = place === 'outdoor' && small;
  const indoors = edition === '2023' && small ? reasons.indoorsAsk : reasons.indoors;
  const reason = place === 'indoor' ? indoors : required ? reasons.outdoors : reasons.outdoorsAbove;
  return { required, reason, clause: clause(edition, '210.8(F)') };
}
