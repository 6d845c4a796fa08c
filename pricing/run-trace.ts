import type { Trace } from '../shared/quote';
import { feetInWords } from '../shared/units';
import { clause, type CodeEdition } from './electrical/edition';
import type { RunPlan } from './run/run-plan';

const wayWords: Record<string, string> = {
  surface: 'On the wall',
  open_studs: 'Through open studs',
  attic: 'Through the attic',
  crawl: 'Through the crawl space',
  finished_wall: 'In the finished wall',
  outside_wall: 'On the outside wall',
  underground: 'Underground',
  joists: 'Along the basement joists',
};
const bendClause = { EMT: '358.26', PVC40: '352.26', PVC80: '352.26', NM_B: '334.24' } as const;
const supportClause = { EMT: '358.30', PVC40: '352.30', PVC80: '352.30', NM_B: '334.30' } as const;

/** How the run's figures came to be: each stretch, the sum, bends and supports. */
export function runTrace({ legs, lengthFt, wallFt, bends90, pullPoints, supports, method }: RunPlan, edition: CodeEdition): Trace[] {
  const feet = (value: number) => feetInWords(value);
  const inches = (value: number) => Math.round(value * 12);
  // The rest of the whole inches, so that the shown lengths add up.
  const upDownFt = (inches(lengthFt) - inches(wallFt)) / 12;
  return [
    ...legs.map(({ way, levelFt, upDownFt: rise }) => ({
      what: wayWords[way] ?? way,
      value: `${feet(levelFt)} along, ${feet(rise)} up and down`,
      clause: 'run geometry',
    })),
    { what: 'Whole run', value: `${feet(wallFt)} along, ${feet(upDownFt)} up and down, ${feet(lengthFt)} in all`, clause: 'run geometry' },
    ...(method === 'NM_B'
      ? []
      : [
          {
            what: 'Bends of 90 degrees',
            value: `${bends90}, pull points ${pullPoints}`,
            clause: `${clause(edition, bendClause[method])}: 360 degrees at most between pull points`,
          },
        ]),
    {
      what: 'Supports',
      value: supports === 0 ? 'none: fished inside the walls' : String(supports),
      clause: clause(edition, supports === 0 ? '334.30(B)(1)' : supportClause[method]),
    },
  ];
}
