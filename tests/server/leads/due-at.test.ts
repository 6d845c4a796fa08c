import { dueAt } from '../../../server/leads/due-at';

describe('when a lead is due: 5 p.m. of the second working day, where the home is', () => {
  it.each([
    // Calendar days from the calendar of 2026; federal holidays: 5 U.S.C. 6103(a). Two working days: invented for the demo.
    ['a Tuesday', '2026-12-01T17:00:00Z', '2026-12-04T00:00:00.000Z'],
    ['a Tuesday by the clock of the home, a Wednesday by ours', '2026-12-02T05:00:00Z', '2026-12-04T00:00:00.000Z'],
    ['a Friday: over the weekend', '2026-12-04T17:00:00Z', '2026-12-09T00:00:00.000Z'],
    ['a Saturday', '2026-12-05T17:00:00Z', '2026-12-09T00:00:00.000Z'],
    ['a Wednesday before Thanksgiving (Thursday, November 26)', '2026-11-25T17:00:00Z', '2026-12-01T00:00:00.000Z'],
  ])('%s', (_name, at, due) => expect(dueAt(new Date(at), 'America/Denver').toISOString()).toBe(due));
});
