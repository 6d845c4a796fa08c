import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { checkCase, checkers } from '../../support/electrical-checks';
import type { CheckCase } from '../../support/electrical-checks';

/** Our check list: inputs, expected values, tolerance and source of each. It is data, never bent to the code. */
interface CaseFile { readonly case_count: number; readonly groups: Readonly<Record<string, readonly CheckCase[]>> }
const { groups, case_count: caseCount } = JSON.parse(readFileSync(join(__dirname, 'cases.json'), 'utf8')) as CaseFile;

for (const [group, cases] of Object.entries(groups)) {
  describe(group, () => {
    for (const entry of cases) {
      const name = `${entry.id}: ${entry.source}${entry.from_memory ? ' (from memory)' : ''}${entry.note ? `. ${entry.note}` : ''}`;
      it(name, () => checkCase(group, entry));
    }
  });
}

it('runs every case of the list, each group by its own function', () => {
  expect(Object.values(groups).reduce((sum, cases) => sum + cases.length, 0)).toBe(caseCount);
  expect(Object.keys(groups).sort()).toEqual(Object.keys(checkers).sort());
});
