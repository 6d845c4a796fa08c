import type { Takeoff } from '../takeoff/takeoff';
import { RulebookError, type CompiledEdition, type CompiledRule } from './compile';
import type { RuleContext } from './names';
import type { Jurisdiction, RuleKind } from './schema';

/** One rule's part of a line. */
export interface Applied {
  readonly line: number;
  readonly rule: string;
  readonly words: string;
  readonly quantity: number;
  readonly unit: string;
  readonly unitCents: number;
  readonly cents: number;
}

/** Cents by line, in the edition's order, and their sum. */
export interface Charged {
  readonly lineCents: readonly number[];
  readonly totalCents: number;
  readonly hours: number;
}

type Take = (applied: Applied) => void;

/** The sums of one evaluation while it runs. */
interface Sheet {
  readonly lineCents: number[];
  readonly byKind: Record<RuleKind, number>;
  totalCents: number;
  hours: number;
  readonly take: Take | undefined;
}

function charge(sheet: Sheet, { line, rule }: CompiledRule, words: string, quantity: number, unit: string, unitCents: number): void {
  if (quantity === 0) return;
  const cents = Math.round(quantity * unitCents);
  sheet.lineCents[line] = (sheet.lineCents[line] ?? 0) + cents;
  sheet.byKind[rule.kind] += cents;
  sheet.totalCents += cents;
  sheet.take?.({ line, rule: rule.id, words, quantity, unit, unitCents, cents });
}

function chargeHours(sheet: Sheet, rule: CompiledRule, words: string, taskHours: number, rateCents: number): void {
  const hours = Math.round(taskHours * 100) / 100;
  sheet.hours += hours;
  charge(sheet, rule, words, hours, 'h', rateCents);
}

const holds = (rule: CompiledRule, context: RuleContext): boolean => rule.when === null || rule.when(context) === true;

function chargeTakeoff(sheet: Sheet, compiled: CompiledEdition, context: RuleContext, takeoff: Takeoff): void {
  for (const { item, words, quantity } of takeoff.items) {
    for (const { rule, unit, unitCents } of compiled.claimsOn(item, 'takeoff'))
      if (holds(rule, context)) charge(sheet, rule, words, quantity, unit, unitCents);
  }
  for (const { task, quantity } of takeoff.tasks) {
    for (const { rule, words, hours, unitCents } of compiled.claimsOn(task, 'takeoff-tasks'))
      if (holds(rule, context)) chargeHours(sheet, rule, words, quantity * hours, unitCents);
  }
}

function chargeRule(sheet: Sheet, compiled: CompiledEdition, context: RuleContext, rule: CompiledRule): void {
  const { edition } = compiled;
  const { price, id, kind, words } = rule.rule;
  const quantity = Number(rule.quantity?.(context));
  const subject = rule.subject?.(context);
  if (price.by === 'item') {
    const [entry, unitCents] = [edition.priceBook[String(subject)], compiled.itemCents[kind].get(String(subject))];
    if (!entry || unitCents === undefined) throw new RulebookError(`Rule ${id}: the price book has no ${String(subject)}`);
    charge(sheet, rule, entry.words, quantity, entry.unit, unitCents);
  } else if (price.by === 'task') {
    const entry = edition.labor.tasks[String(subject)];
    if (!entry) throw new RulebookError(`Rule ${id}: there are no hours for ${String(subject)}`);
    chargeHours(sheet, rule, entry.words, quantity * entry.typical, edition.labor.rateCents);
  } else if (price.by === 'cents') charge(sheet, rule, words, quantity, price.unit, Number(subject));
}

/** Adds to a line by itself: tax, or what is missing to the smallest job. */
function addTo(sheet: Sheet, line: number, rule: string, words: string, cents: number): void {
  sheet.lineCents[line] = (sheet.lineCents[line] ?? 0) + cents;
  sheet.totalCents += cents;
  sheet.take?.({ line, rule, words, quantity: 1, unit: 'each', unitCents: cents, cents });
}

const taxed = ['material', 'charger', 'labor'] as const;
const taxWords = { material: 'Sales tax on materials', charger: 'Sales tax on the charger', labor: 'Sales tax on labor' } as const;

/**
 * Applies every rule to one home, setting and way of the run: cents by line, sales tax by kind, then the smallest job.
 * `take` receives each rule's part, for explaining; leave it out where only the sums matter.
 * @throws RulebookError when a thing or task has no price, no rule charges for it, or a rule cannot be worked out.
 */
export function evaluateRules(
  compiled: CompiledEdition,
  context: RuleContext,
  takeoff: Takeoff,
  place: Jurisdiction,
  take?: Take,
): Charged {
  const sheet: Sheet = {
    lineCents: new Array<number>(compiled.lines.length).fill(0),
    byKind: { material: 0, charger: 0, labor: 0, fee: 0 },
    totalCents: 0,
    hours: 0,
    take,
  };
  chargeTakeoff(sheet, compiled, context, takeoff);
  for (const rule of compiled.rules) if (holds(rule, context)) chargeRule(sheet, compiled, context, rule);
  for (const kind of taxed) {
    const cents = Math.round((sheet.byKind[kind] * place.tax[kind]) / 10_000);
    if (cents !== 0) addTo(sheet, compiled.taxLine, `tax-${kind}`, taxWords[kind], cents);
  }
  const missing = compiled.edition.minimumCents - sheet.totalCents;
  if (missing > 0) addTo(sheet, compiled.minimumLine, 'minimum', 'Smallest job', missing);
  return { lineCents: sheet.lineCents, totalCents: sheet.totalCents, hours: Math.round(sheet.hours * 100) / 100 };
}
