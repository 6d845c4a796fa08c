import type { CircuitDesign } from '../electrical/circuit-types';
import { pipeFt, stapledFt, undergroundFt } from '../run/legs';
import type { RunPlan } from '../run/run-plan';
import { supportCount, supportRule } from '../run/supports';
import { namesOf, type CircuitNames, type Name } from './names';
import type { ItemUnit, TakeoffItem, TakeoffOptions } from './types';
import { wireFt } from './wire-length';

const STICK_FT = 10;
const staple: Name = { item: 'strap.nm', words: 'Cable staple' };
const cableConnector: Name = { item: 'fitting.nm.connector', words: 'Cable connector' };
const pullBox: Name = { item: 'box.pull', words: 'Pull box' };
const sealant: Name = { item: 'seal.wall', words: 'Sealant for a hole in a wall' };
const patchKit: Name = { item: 'patch.kit', words: 'Drywall and compound for one opening' };
const paint: Name = { item: 'paint.pipe', words: 'Paint to match' };

/** Wire or cable, pipe with its fittings, straps, seals, patches and paint of a run. */
export function runItems(circuit: CircuitDesign, run: RunPlan, options: TakeoffOptions): TakeoffItem[] {
  const items: TakeoffItem[] = [];
  const names = namesOf(circuit);
  if (circuit.method === 'NM_B') addCable(items, names, run, options);
  else addWires(items, names, run, options);
  addPipe(items, names, circuit, run);
  add(items, sealant, run.wallPenetrations + run.masonryCores);
  add(items, patchKit, run.patches);
  add(items, paint, run.paint ? 1 : 0);
  return items;
}

function add(items: TakeoffItem[], { item, words }: Name, quantity: number, unit: ItemUnit = 'each'): void {
  if (quantity > 0) items.push({ item, words, quantity, unit });
}

/** Two hots and a ground by color; a white neutral only for an outlet, which has a place for it (common practice, no source). */
function addWires(items: TakeoffItem[], names: CircuitNames, run: RunPlan, options: TakeoffOptions): void {
  const feet = wireFt(run.lengthFt, options);
  add(items, names.black, feet, 'ft');
  add(items, names.red, feet, 'ft');
  add(items, names.green, feet, 'ft');
  if (options.connection === 'plug_in') add(items, names.white, feet, 'ft');
}

function addCable(items: TakeoffItem[], names: CircuitNames, run: RunPlan, options: TakeoffOptions): void {
  add(items, options.connection === 'plug_in' ? names.cableWithNeutral : names.cable, wireFt(run.lengthFt, options), 'ft');
  add(items, staple, supportCount(stapledFt('NM_B', run.legs), supportRule('NM_B')));
  add(items, cableConnector, 2);
}

/** Whole sticks, one coupling fewer, a connector and a bushing at each end and at each pull box, straps by the tables. */
function addPipe(items: TakeoffItem[], names: CircuitNames, { method }: CircuitDesign, run: RunPlan): void {
  const aboveGroundFt = pipeFt(method, run.legs);
  const lengthFt = aboveGroundFt + undergroundFt(run.legs);
  if (lengthFt <= 0) return;
  const isCable = method === 'NM_B';
  const sticks = Math.ceil(lengthFt / STICK_FT);
  add(items, names.pipe, sticks, '10 ft stick');
  add(items, names.coupling, sticks - 1);
  add(items, names.connector, 2 + 2 * run.pullPoints);
  add(items, names.bushing, 2);
  add(items, names.elbow, isCable ? 0 : run.wallPenetrations + run.masonryCores);
  add(items, pullBox, run.pullPoints);
  add(items, names.strap, supportCount(aboveGroundFt, supportRule(isCable ? 'EMT' : method, names.pipeSize)));
}
