import type { CircuitDesign } from '../electrical/circuit-types';
import { pipeFt, undergroundFt, type RunWay } from '../run/legs';
import type { RunPlan } from '../run/run-plan';
import type { TakeoffOptions, TakeoffTask } from './types';

/** Which work a cable's way is. In a pipe, and in the ground, other tasks count. */
const cableTask: Readonly<Record<RunWay, 'nm_open' | 'nm_attic' | 'nm_fished' | null>> = {
  open_studs: 'nm_open', joists: 'nm_open', outside_wall: 'nm_open', attic: 'nm_attic', crawl: 'nm_attic', finished_wall: 'nm_fished',
  surface: null, underground: null,
};

/** What the crew does on a run and at its two ends, in the units of the rulebook's hours. */
export function tasksOf(circuit: CircuitDesign, run: RunPlan, { connection }: TakeoffOptions): TakeoffTask[] {
  const isCable = circuit.method === 'NM_B';
  const surfaceFt = pipeFt(circuit.method, run.legs);
  const tasks: TakeoffTask[] = [];

  add(tasks, 'panel_tie_in', 1);
  add(tasks, circuit.method === 'PVC40' || circuit.method === 'PVC80' ? 'pvc' : 'emt', (surfaceFt + undergroundFt(run.legs)) / 10, '10 ft');
  if (!isCable) {
    add(tasks, 'bend', run.bends90 + run.pullPoints + run.wallPenetrations + run.masonryCores);
    add(tasks, 'pull', run.lengthFt / 10, '10 ft');
  } else {
    add(tasks, 'pull', surfaceFt / 10, '10 ft');
    for (const task of ['nm_open', 'nm_attic', 'nm_fished'] as const) add(tasks, task, cableFt(run, task) / 10, '10 ft');
  }
  add(tasks, 'trench', run.trenchFt, 'ft');
  add(tasks, 'wall_penetration', run.wallPenetrations);
  add(tasks, 'masonry_core', run.masonryCores);
  add(tasks, 'patch', run.patches);
  if (run.paint) add(tasks, 'paint', surfaceFt / 10, '10 ft');
  if (connection === 'plug_in') add(tasks, 'receptacle', 1);
  else {
    add(tasks, 'mount_charger', 1);
    if (circuit.disconnectRequired) add(tasks, 'disconnect', 1);
  }
  add(tasks, 'commissioning', 1);
  return tasks;
}

function add(tasks: TakeoffTask[], task: string, quantity: number, unit: TakeoffTask['unit'] = 'each'): void {
  if (quantity > 0) tasks.push({ task, quantity, unit });
}

const cableFt = (run: RunPlan, task: string): number =>
  run.legs.reduce((sum, { way, levelFt, upDownFt }) => (cableTask[way] === task ? sum + levelFt + upDownFt : sum), 0);
