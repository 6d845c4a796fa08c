import type { PanelChange } from '../shared/quote';
import { designFor, sharedDesignFor } from './circuit-for';
import { evseVa } from './electrical/evse-load';
import type { CircuitDesign } from './electrical/circuit';
import type { Home } from './home';
import { chargersSupplied, kwOf, type OptionPlan } from './option-plan';
import { capacityFixes, panelFor, spaceFixOf, type CapacityFix, type SpaceFix } from './panel-fix';
import type { RunPlan } from './run/run-plan';
import type { CompiledEdition } from './rulebook/compile';
import { evaluateRules, type Applied, type Charged } from './rulebook/evaluate';
import type { RuleContext } from './rulebook/names';
import type { Jurisdiction } from './rulebook/schema';
import { takeoff, type Takeoff } from './takeoff/takeoff';

/** One option in one home: its cheapest feasible way, and what made the price. */
export interface PricedOption extends Charged {
  readonly option: OptionPlan;
  readonly run: RunPlan;
  readonly circuit: CircuitDesign;
  readonly takeoff: Takeoff;
  readonly context: RuleContext;
  readonly capacityFix: CapacityFix;
  readonly panelChange: PanelChange;
}

const places = new WeakMap<Jurisdiction, RuleContext['place']>();
function placeFor(place: Jurisdiction): RuleContext['place'] {
  let known = places.get(place);
  if (!known)
    places.set(
      place,
      (known = { name: place.name, permitCents: place.permitCents, inspectionVisits: place.inspectionVisits, served: true }),
    );
  return known;
}

function contextOf(home: Home, option: OptionPlan, run: RunPlan, circuit: RuleContext['circuit'], capacityFix: CapacityFix): RuleContext {
  const { known, verdict, serviceAmps, homeAmps, place } = home;
  const spaceFix = spaceFixOf(known.blankSpaces, capacityFix);
  const chargerAmps = evseVa(place.codeEdition, option.chargingAmps * known.volts) / known.volts;
  return {
    facts: known,
    run,
    circuit,
    option: {
      chargingAmps: option.chargingAmps,
      breakerAmps: circuit.breakerAmps,
      kw: kwOf(option.chargingAmps, known),
      plugIn: option.connection === 'plug_in',
      chargersSupplied: chargersSupplied(option, known),
      chargers: option.chargers,
    },
    panel: panelFor(capacityFix, spaceFix),
    load: { share: (homeAmps + chargerAmps) / serviceAmps, homeAmps, serviceAmps, status: verdict.status },
    place: placeFor(place),
  };
}

/**
 * Prices one option in one home by every way that looks right and every way to make the panel carry it, and keeps the cheapest.
 * @param exact design the circuit for the very length, for documents.
 * @returns null when no way can be built.
 */
export function priceOption(compiled: CompiledEdition, home: Home, option: OptionPlan, exact = false): PricedOption | null {
  const { panelSlackFt, chargerSlackFt, wastePercent } = compiled.edition.wire;
  // Fields are named one by one: this runs thousands of times for a range, and copying by spread costs more than the sums.
  const allowance = {
    panelSlackFt,
    chargerSlackFt,
    wastePercent,
    connection: option.connection,
    chargersSupplied: chargersSupplied(option, home.known),
  };
  let best: PricedOption | null = null;
  for (const run of home.runs) {
    const circuit = exact ? designFor(home, option, run) : sharedDesignFor(home, option, run);
    if (!circuit) continue;
    const taken = takeoff(circuit.design, run, home.known, allowance);
    for (const capacityFix of capacityFixes(home, option.chargingAmps)) {
      const context = contextOf(home, option, run, circuit.view, capacityFix);
      const charged = evaluateRules(compiled, context, taken, home.place);
      if (best !== null && best.totalCents <= charged.totalCents) continue;
      best = {
        lineCents: charged.lineCents,
        totalCents: charged.totalCents,
        hours: charged.hours,
        option,
        run,
        circuit: circuit.design,
        takeoff: taken,
        context,
        capacityFix,
        panelChange: capacityFix !== 'none' ? capacityFix : (context.panel.spaceFix as SpaceFix),
      };
    }
  }
  return best;
}

/** Each rule's part of a price that was found by priceOption. */
export function explainPrice(compiled: CompiledEdition, home: Home, priced: PricedOption): Applied[] {
  const parts: Applied[] = [];
  evaluateRules(compiled, priced.context, priced.takeoff, home.place, (applied) => parts.push(applied));
  return parts;
}
