import { factsSchema } from '../../shared/facts';
import { loadIds } from '../../shared/loads';
import type { Facts } from '../../shared/facts';
import type { KnownFacts } from '../known-facts';

/** What is being priced: one setting, one way of the run, in one home. Rules read it by the names below. */
export interface RuleContext {
  readonly facts: KnownFacts;
  readonly option: {
    readonly chargingAmps: number;
    readonly breakerAmps: number;
    readonly kw: number;
    readonly plugIn: boolean;
    /** Chargers that we supply, and chargers on the circuit. */
    readonly chargersSupplied: number;
    readonly chargers: number;
  };
  readonly circuit: {
    readonly words: string;
    readonly hotAwg: string;
    readonly groundAwg: string;
    readonly method: string;
    readonly racewayTradeSize: string | null;
    readonly gfciRequired: boolean;
    readonly disconnectRequired: boolean;
    readonly breakerAmps: number;
  };
  readonly run: {
    readonly lengthFt: number;
    readonly wallFt: number;
    readonly upDownFt: number;
    readonly bends90: number;
    readonly pullPoints: number;
    readonly supports: number;
    readonly wallPenetrations: number;
    readonly patches: number;
    readonly outdoor: boolean;
    readonly method: string;
    readonly way: string;
    readonly methodWords: string;
  };
  readonly panel: {
    /** none, tandem, sub_panel: what makes room for the breaker. */
    readonly spaceFix: string;
    /** none, energy_management, service_upgrade: what makes the service carry it. */
    readonly capacityFix: string;
    readonly changeWords: string;
  };
  /** Home and charger together as a share of the service, by the most cautious practice; 1 is full. */
  readonly load: { readonly share: number; readonly homeAmps: number; readonly serviceAmps: number; readonly status: string };
  readonly place: { readonly name: string; readonly permitCents: number; readonly inspectionVisits: number; readonly served: boolean };
}

/** Flags read facts before anything is sampled: `null` there means "not known". */
export interface FlagContext {
  readonly facts: Facts | KnownFacts;
  readonly place: { readonly served: boolean };
  /** How many ways the wire has; 1 while nothing says otherwise. */
  readonly run: { readonly ways: number };
  /** False when neither the service, a load manager nor the largest upgrade carries a charger. */
  readonly load: { readonly carried: boolean };
}

const factNames = [...Object.keys(factsSchema.shape), ...loadIds.flatMap((id) => [`loads.${id}.present`, `loads.${id}.amount`])].map(
  (name) => `facts.${name}`,
);
const within = <Group extends Exclude<keyof RuleContext, 'facts'>>(group: Group, keys: readonly (keyof RuleContext[Group] & string)[]) =>
  keys.map((key) => `${group}.${key}`);

/** Every name that a price rule, a line's words or a flag may read. */
export const ruleNames: ReadonlySet<string> = new Set([
  ...factNames,
  ...within('option', ['chargingAmps', 'breakerAmps', 'kw', 'plugIn', 'chargersSupplied', 'chargers']),
  ...within('circuit', ['words', 'hotAwg', 'groundAwg', 'method', 'racewayTradeSize', 'gfciRequired', 'disconnectRequired', 'breakerAmps']),
  ...within('run', [
    'lengthFt',
    'wallFt',
    'upDownFt',
    'bends90',
    'pullPoints',
    'supports',
    'wallPenetrations',
    'patches',
    'outdoor',
    'method',
    'way',
    'methodWords',
  ]),
  ...within('panel', ['spaceFix', 'capacityFix', 'changeWords']),
  ...within('load', ['share', 'homeAmps', 'serviceAmps', 'status']),
  ...within('place', ['name', 'permitCents', 'inspectionVisits', 'served']),
]);
export const flagNames: ReadonlySet<string> = new Set([...factNames, 'place.served', 'run.ways', 'load.carried']);
