import type { Lead, LeadRow, LeadStage } from '../../shared/api/desk';
import { countInWords } from '../../shared/units';

/** One row of the list as the database gives it. */
export interface LeadRecord {
  readonly id: string; readonly jobNumber: number; readonly name: string; readonly town: string; readonly work: string; readonly workNote: string;
  readonly lowCents: number | null; readonly highCents: number | null; readonly firmCents: number | null; readonly stage: LeadStage; readonly dueAt: Date | null;
  readonly assignee: string | null; readonly depositState: string | null; readonly createdAt: Date; readonly photos: number;
}

/** Columns of `LeadRecord`, for queries over leads joined with staff and deposits. */
export const rowColumns = `leads.id, leads.job_number AS "jobNumber", leads.name, leads.town, leads.work, leads.work_note AS "workNote",
  leads.low_cents AS "lowCents", leads.high_cents AS "highCents", leads.firm_cents AS "firmCents", leads.stage, leads.due_at AS "dueAt",
  staff.name AS assignee, deposits.state AS "depositState", leads.created_at AS "createdAt",
  (SELECT count(*)::int FROM photos WHERE photos.intake_id = leads.intake_id AND photos.removed_at IS NULL) AS photos`;

export const presentLeadRow = (lead: LeadRecord): LeadRow => ({
  id: lead.id, jobNumber: lead.jobNumber, name: lead.name, town: lead.town, work: lead.work, workNote: lead.workNote,
  lowCents: lead.lowCents, highCents: lead.highCents, firmCents: lead.firmCents, stage: lead.stage,
  dueAt: lead.dueAt?.toISOString() ?? null,
  timeNote: lead.photos === 0 ? 'No photos' : countInWords(lead.photos, 'photo', 'photos'),
  assignee: lead.assignee, depositPaid: lead.depositState === 'paid', createdAt: lead.createdAt.toISOString(),
});

type Fact = Lead['facts'][number];

/** Facts whose words changed between the document and now: what the homeowner changed after the price was frozen. */
export const differencesOf = (frozen: readonly Fact[], now: readonly Fact[]): Lead['differences'] => {
  const before = new Map(frozen.map((fact) => [fact.name, fact]));
  const after = new Map(now.map((fact) => [fact.name, fact]));
  return [...new Set([...before.keys(), ...after.keys()])].flatMap((name) => {
    const [was, is] = [before.get(name), after.get(name)];
    return was?.words === is?.words ? [] : [{ label: (was ?? is)?.label ?? name, before: was?.words ?? 'Not asked', after: is?.words ?? 'Not asked' }];
  });
};
