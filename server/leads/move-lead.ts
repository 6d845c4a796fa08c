import { leadStageWords, moveLead as moveLeadEndpoint, type LeadStage } from '../../shared/api/desk';
import type { Role } from '../../shared/roles';
import type { SignedIn } from '../auth/desk-sessions';
import type { Deps } from '../deps';
import { problem } from '../http/problem';

/** Where a lead may go by hand from each stage: never to "firm price sent", which only sending one does. A closed one can be opened again. */
const moves: Record<LeadStage, readonly LeadStage[]> = {
  'check-photos': ['waiting-on-photo', 'needs-a-visit', 'closed'],
  'waiting-on-photo': ['check-photos', 'needs-a-visit', 'closed'],
  'needs-a-visit': ['check-photos', 'waiting-on-photo', 'closed'],
  'firm-price-sent': ['check-photos', 'accepted', 'closed'],
  accepted: ['booked', 'check-photos', 'closed'],
  booked: ['accepted', 'closed'],
  closed: ['check-photos'],
};

/** Stages to which a role may move a lead now; the same roles as the endpoint's access. */
export const movesFor = (stage: LeadStage, role: Role): readonly LeadStage[] => (moveLeadEndpoint.access.includes(role) ? moves[stage] : []);

export interface Move { readonly stage: LeadStage; readonly note?: string | undefined }

/**
 * Moves a lead to another stage and writes it in the history, in one transaction.
 * @param version what the caller saw; another one means that somebody was faster
 * @throws problems not-found, stale, conflict
 */
export async function moveLead({ sequelize, models, clock }: Deps, id: string, version: number, move: Move, { staff }: SignedIn): Promise<void> {
  await sequelize.transaction(async (transaction) => {
    const lead = await models.Lead.findByPk(id, { transaction, lock: transaction.LOCK.UPDATE });
    if (!lead) throw problem('not-found', 'There is no such lead');
    if (lead.version !== version) throw problem('stale', `Someone moved this lead to “${leadStageWords[lead.stage]}” or changed it. Look at it again, then decide.`);
    if (!moves[lead.stage].includes(move.stage)) {
      throw problem('conflict', `A lead at “${leadStageWords[lead.stage]}” cannot go to “${leadStageWords[move.stage]}”.`, [{ pointer: '/stage', detail: 'Not from this stage' }]);
    }
    const before = lead.stage;
    await lead.update({ stage: move.stage, version: lead.version + 1, updatedAt: clock() }, { transaction });
    await models.History.create({
      leadId: id, at: clock(), staffId: staff.id, who: staff.name, what: move.note ? `Moved: ${move.note}` : 'Moved', before: leadStageWords[before], after: leadStageWords[move.stage],
    }, { transaction });
  });
}
