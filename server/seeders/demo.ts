import type { Deps } from '../deps';
import { demoPeople } from './demo-people';
import { demoPlan } from './demo-plan';
import { seedStaff } from './demo-staff';
import { chance } from './random';
import { seedIntake } from './seed-intake';

const SEED = 20_261;

/**
 * Fills an empty database with the demo: staff, and some forty intakes at every stage, priced by the real engine, with dates relative to now.
 * A run that was broken off is gone on with: the staff may sign in only when all is there.
 * @returns how many intakes were made; 0 when the database already has staff
 */
export async function seedDemo(deps: Deps): Promise<number> {
  const { models } = deps;
  if (await models.Staff.count({ where: { active: true } }) > 0) return 0;
  const staff = await seedStaff(models);
  const done = await models.Intake.count();
  const today = deps.clock();
  for (const [index, plan] of demoPlan.entries()) {
    if (index < done) continue;
    await seedIntake({ deps, random: chance(SEED + index), staff }, plan, demoPeople[index % demoPeople.length] ?? demoPeople[0], index, today);
  }
  await models.Staff.update({ active: true }, { where: { id: staff.map(({ id }) => id) } });
  return demoPlan.length - done;
}
