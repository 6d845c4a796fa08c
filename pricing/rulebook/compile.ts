import { LogicEngine } from 'json-logic-engine';
import type { FlagContext, RuleContext } from './names';
import type { Edition, FlagRule, Jurisdiction, LineRule, Logic, Rule, RuleKind } from './schema';

/** Evaluates one compiled expression. */
export type Compute<Context> = (context: Context) => unknown;

export interface CompiledRule {
  readonly rule: Rule;
  /** Index of the rule's line in the edition. */
  readonly line: number;
  /** Null: always. */
  readonly when: Compute<RuleContext> | null;
  readonly quantity: Compute<RuleContext> | null;
  /** Item or task key, or cents. */
  readonly subject: Compute<RuleContext> | null;
}

/** A takeoff thing or task as one rule charges for it. */
export interface Claim {
  readonly rule: CompiledRule;
  readonly words: string;
  readonly unit: string;
  readonly unitCents: number;
  /** Hours a unit of a task; 0 for things. */ readonly hours: number;
}

export interface CompiledEdition {
  readonly edition: Edition;
  readonly lines: readonly LineRule[];
  /** Rules that ask by themselves; those of the takeoff are in `claimsOn`. */
  readonly rules: readonly CompiledRule[];
  /** The rules that charge for a thing or a task of the takeoff. */
  readonly claimsOn: (key: string, by: 'takeoff' | 'takeoff-tasks') => readonly Claim[];
  readonly flags: readonly { readonly flag: FlagRule; readonly when: Compute<FlagContext> }[];
  readonly taxLine: number;
  readonly minimumLine: number;
  readonly jurisdictionByZip: ReadonlyMap<string, Jurisdiction>;
  /** Price of one unit in cents with markup, by item key, for each kind of rule. */
  readonly itemCents: Readonly<Record<RuleKind, ReadonlyMap<string, number>>>;
}

/** A rulebook that cannot be used, and why. */
export class RulebookError extends Error {}

const engine = new LogicEngine();

function compute<Context>(logic: Logic): Compute<Context> {
  if (logic === null || typeof logic !== 'object') return () => logic;
  // The engine throws bare values, such as NaN for arithmetic on words; constant parts already while it builds.
  const guarded = <Value>(work: () => Value): Value => {
    try {
      return work();
    } catch {
      throw new RulebookError(`This cannot be worked out: ${JSON.stringify(logic)}`);
    }
  };
  const built: unknown = guarded(() => engine.build(logic));
  return typeof built === 'function' ? (context) => guarded(() => (built as Compute<Context>)(context)) : () => built;
}

const subjectOf = (price: Rule['price']): Logic | undefined =>
  price.by === 'item' ? price.item : price.by === 'task' ? price.task : price.by === 'cents' ? price.cents : undefined;

function compileRule(rule: Rule, lineIndex: ReadonlyMap<string, number>): CompiledRule {
  const line = lineIndex.get(rule.line);
  if (line === undefined) throw new RulebookError(`Rule ${rule.id} names the line ${rule.line}, which is not there`);
  const subject = subjectOf(rule.price);
  return {
    rule,
    line,
    when: rule.when === true ? null : compute<RuleContext>(rule.when),
    quantity: 'quantity' in rule.price ? compute<RuleContext>(rule.price.quantity) : null,
    subject: subject === undefined ? null : compute<RuleContext>(subject),
  };
}

function withMarkup(edition: Edition, kind: RuleKind): ReadonlyMap<string, number> {
  const markup = kind === 'material' ? edition.markup.material : kind === 'charger' ? edition.markup.charger : 0;
  return new Map(Object.entries(edition.priceBook).map(([item, { cents }]) => [item, Math.round((cents * (10_000 + markup)) / 10_000)]));
}

/** Finds the claims on a key once and remembers them: the keys of all takeoffs are few. */
function claimFinder(
  edition: Edition,
  rules: readonly CompiledRule[],
  itemCents: CompiledEdition['itemCents'],
): CompiledEdition['claimsOn'] {
  const found = { takeoff: new Map<string, readonly Claim[]>(), 'takeoff-tasks': new Map<string, readonly Claim[]>() };
  const claim = (rule: CompiledRule, key: string): Claim | null => {
    const { price, kind, id } = rule.rule;
    if (price.by === 'takeoff' && key.startsWith(price.items)) {
      const [entry, unitCents] = [edition.priceBook[key], itemCents[kind].get(key)];
      if (!entry || unitCents === undefined) throw new RulebookError(`Rule ${id}: the price book has no ${key}`);
      return { rule, words: entry.words, unit: entry.unit, unitCents, hours: 0 };
    }
    if (price.by === 'takeoff-tasks' && key.startsWith(price.tasks)) {
      const entry = edition.labor.tasks[key];
      if (!entry) throw new RulebookError(`Rule ${id}: there are no hours for ${key}`);
      return { rule, words: entry.words, unit: 'h', unitCents: edition.labor.rateCents, hours: entry.typical };
    }
    return null;
  };
  return (key, by) => {
    const known = (by === 'takeoff' ? found.takeoff : found['takeoff-tasks']).get(key);
    if (known) return known;
    const claims = rules
      .filter(({ rule }) => rule.price.by === by)
      .map((rule) => claim(rule, key))
      .filter((entry) => entry !== null);
    if (claims.length === 0) throw new RulebookError(`No rule charges for ${key}`);
    found[by].set(key, claims);
    return claims;
  };
}

const compiledEditions = new WeakMap<Edition, CompiledEdition>();

/**
 * Compiles an edition once; the same object gives the same result back.
 * @throws RulebookError when a rule names a missing line, or the lines "tax" and "minimum" are missing. validate.ts finds the rest.
 */
export function compileEdition(edition: Edition): CompiledEdition {
  const known = compiledEditions.get(edition);
  if (known) return known;
  const lineIndex = new Map(edition.lines.map((line, index) => [line.id, index]));
  const [taxLine, minimumLine] = [lineIndex.get('tax'), lineIndex.get('minimum')];
  if (taxLine === undefined || minimumLine === undefined) throw new RulebookError('A rulebook needs the lines "tax" and "minimum"');
  const rules = edition.rules.map((rule) => compileRule(rule, lineIndex));
  const itemCents = {
    material: withMarkup(edition, 'material'),
    charger: withMarkup(edition, 'charger'),
    labor: withMarkup(edition, 'labor'),
    fee: withMarkup(edition, 'fee'),
  };
  const compiled: CompiledEdition = {
    edition,
    lines: edition.lines,
    taxLine,
    minimumLine,
    itemCents,
    rules: rules.filter(({ rule }) => rule.price.by !== 'takeoff' && rule.price.by !== 'takeoff-tasks'),
    claimsOn: claimFinder(edition, rules, itemCents),
    flags: edition.flags.map((flag) => ({ flag, when: compute<FlagContext>(flag.when) })),
    jurisdictionByZip: new Map(edition.jurisdictions.flatMap((place) => place.zips.map((zip) => [zip, place] as const))),
  };
  compiledEditions.set(edition, compiled);
  return compiled;
}
