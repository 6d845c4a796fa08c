import type { Deps } from '../deps';
import { demoPeople } from './demo-people';
import { demoPlan } from './demo-plan';
import { seedStaff } from './demo-staff';
import { chance } from './random';
import { seedIntake } from './seed-intake';

const SEED = 20_261;

/**
 * Fills an empty database with the demo: staff, and some forty intakes at every stage, priced by the real engine, with dates relative to now.
 * @returns how many intakes were made; 0 when the database already has staff
 */
export async function seedDemo(deps: Deps): Promise<number> {
  if (await deps.models.Staff.count() > 0) return 0;
  const staff = await seedStaff(deps.models);
  const random = chance(SEED);
  const today = deps.clock();
  for (const [index, plan] of demoPlan.entries()) {
    await seedIntake({ deps, random, staff }, plan, demoPeople[index % demoPeople.length] ?? demoPeople[0], index, today);
  }
  return demoPlan.length;
}
