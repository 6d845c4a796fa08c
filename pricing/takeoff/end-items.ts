import type { CircuitDesign } from '../electrical/circuit-types';
import type { KnownFacts } from '../known-facts';
import type { RunPlan } from '../run/run-plan';
import { namesOf, type Name } from './names';
import type { TakeoffItem, TakeoffOptions } from './types';

const outlet: Name = { item: 'receptacle.14-50', words: 'EV-grade 14-50 outlet' };
const outletBox: Name = { item: 'receptacle.box', words: 'Outlet box and cover' };
const outdoorBox: Name = { item: 'receptacle.box.outdoor', words: 'Outlet box with an in-use cover' };
const disconnect: Name = { item: 'disconnect.100', words: '100 A switch that locks open' };
const mounting: Name = { item: 'mounting.wood', words: 'Mounting board and screws' };
const masonryMounting: Name = { item: 'mounting.masonry', words: 'Masonry anchors' };
const charger: Name = { item: 'charger.48', words: 'Wall charger, up to 48 A' };
const labels: Name = { item: 'label.set', words: 'Labels and directory card' };

/** What hangs at the two ends of a run: breaker and labels at the panel; charger or outlet, and a switch where the code asks for it. */
export function endItems(circuit: CircuitDesign, run: RunPlan, known: KnownFacts, options: TakeoffOptions): TakeoffItem[] {
  const { connection, chargersSupplied } = options;
  const items: TakeoffItem[] = [];
  add(items, namesOf(circuit).breaker);
  if (connection === 'plug_in') {
    add(items, outlet);
    add(items, run.outdoor ? outdoorBox : outletBox);
  } else if (circuit.disconnectRequired) add(items, disconnect);
  // A charger with a plug that they bring hangs on its own bracket, which is theirs to put up.
  if (connection === 'wired' || chargersSupplied > 0) add(items, known.wallFinish === 'masonry' ? masonryMounting : mounting);
  if (chargersSupplied > 0) add(items, charger, chargersSupplied);
  add(items, labels);
  return items;
}

function add(items: TakeoffItem[], { item, words }: Name, quantity = 1): void {
  items.push({ item, words, quantity, unit: 'each' });
}
