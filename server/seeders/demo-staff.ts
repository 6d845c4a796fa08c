import { hashPassword } from '../auth/passwords';
import type { Role } from '../../shared/roles';
import type { Models } from '../models/index';

/** Invented staff of the demo. The password is for the demo alone and stands in the README. */
export const demoPassword = 'copper-run-2026';
export const demoStaff = [
  { role: 'owner', name: 'Odell Finch', email: 'owner@example.com' },
  { role: 'estimator', name: 'Iris Vale', email: 'estimator@example.com' },
  { role: 'sales', name: 'Rafe Alder', email: 'sales@example.com' },
] as const satisfies readonly { role: Role; name: string; email: string }[];

export interface SeededStaff { readonly id: string; readonly name: string; readonly role: Role }

/** Makes the demo's staff, who may not sign in yet, or finds them. @returns them */
export async function seedStaff(models: Models): Promise<readonly SeededStaff[]> {
  const known = await models.Staff.findAll();
  if (known.length > 0) return known;
  const passwordHash = await hashPassword(demoPassword);
  return models.Staff.bulkCreate(demoStaff.map((person) => ({ ...person, passwordHash, active: false })));
}
