import type { Intake } from '../../shared/api/intakes';
import type { Deps } from '../deps';
import type { IntakeColumns } from '../models/intake';
import { listPhotos } from '../photos/list-photos';
import { maskEmail } from './mask-email';
import { placeOfZip } from './place';
import { rangeOf } from './range-of';

/** An intake as its homeowner sees it, with the range that its answers lead to. */
export async function presentIntake({ models, pricing }: Pick<Deps, 'models' | 'pricing'>, intake: IntakeColumns): Promise<Intake> {
  const { version, answers, stage, email } = intake;
  const place = placeOfZip(pricing.edition, answers.zip);
  return {
    version, answers, stage,
    town: place?.name ?? null,
    served: answers.zip === undefined ? null : place !== null,
    photos: await listPhotos(models, intake.id),
    range: rangeOf(pricing, answers),
    savedTo: email === null ? null : maskEmail(email),
  };
}
