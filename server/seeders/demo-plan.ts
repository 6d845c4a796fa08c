import type { LeadStage } from '../../shared/api/desk';
import type { DemoHomeKind } from './demo-homes';

/** What becomes of one invented intake: how far it came, how long ago it started, what kind of home it is. */
export interface DemoIntake {
  readonly reached: 'home' | 'car' | 'panel' | 'loads' | 'garage' | 'priced' | LeadStage;
  readonly homes: readonly [DemoHomeKind, ...DemoHomeKind[]];
  readonly daysAgo: number;
  /** Asked for the link to finish later. */
  readonly later?: boolean;
}

const priced = ['garage', 'garage', 'elsewhere', 'outdoors'] as const;
const several = (reached: DemoIntake['reached'], homes: DemoIntake['homes'], days: readonly number[], later = false): DemoIntake[] => days.map((daysAgo) => ({ reached, homes, daysAgo, later }));

/** Some forty intakes at every stage; days are counted back from the day of seeding. */
export const demoPlan: readonly DemoIntake[] = [
  ...several('home', priced, [1]), ...several('car', priced, [2, 9], true), ...several('panel', priced, [1, 4], true), ...several('panel', priced, [6]),
  ...several('loads', priced, [3, 11], true), ...several('garage', priced, [2, 8]),
  ...several('priced', priced, [0, 1, 3, 5]), ...several('priced', priced, [7, 14], true),
  ...several('needs-a-visit', ['detached', 'odd'], [1, 2, 4, 6]),
  ...several('check-photos', priced, [0, 0, 1, 1, 2, 3]), ...several('waiting-on-photo', priced, [2, 4, 5]),
  ...several('firm-price-sent', priced, [3, 5, 6, 8]), ...several('accepted', priced, [6, 9, 10]), ...several('booked', priced, [9, 12, 15]), ...several('closed', priced, [20, 26]),
];
