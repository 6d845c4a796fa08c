import * as endpoints from '../../shared/api/intakes';
import { bind, type Api } from '../http/bind';
import { presentIntake } from '../intakes/present';
import { askForVisit } from './ask-for-visit';
import { finishLater } from './finish-later';

export function followupRoutes(api: Api): void {
  const { deps } = api;
  bind(api, endpoints.finishLater, ({ intakeId, body, request }) => finishLater(deps, intakeId, body.email, request.get('Idempotency-Key') ?? ''), { limit: 'finish-later' });
  bind(api, endpoints.askForVisit, async ({ intakeId, body }) => presentIntake(deps, await askForVisit(deps, intakeId, body)), { limit: 'deposits' });
}
