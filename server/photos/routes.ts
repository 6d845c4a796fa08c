import * as endpoints from '../../shared/api/intakes';
import type { Deps } from '../deps';
import { bind, type Api } from '../http/bind';
import type { Caller } from '../http/caller';
import { problem } from '../http/problem';
import type { Photo } from '../models/photo';
import { addPhoto, removePhoto } from './add-photo';
import { presentPhoto } from './list-photos';

/** The picture, when the caller may see its intake; to anybody else it does not exist. */
async function visiblePhoto({ models }: Deps, id: string, { intakeId, homeownerIntakeId, session }: Caller): Promise<Photo> {
  const photo = await models.Photo.findOne({ where: { id, removedAt: null } });
  if (!photo || (session === null && photo.intakeId !== intakeId && photo.intakeId !== homeownerIntakeId)) throw problem('not-found');
  return photo;
}

export function photoRoutes(api: Api): void {
  const { deps } = api;

  bind(api, endpoints.addPhoto, async ({ intakeId, body, request }) => {
    if (!request.file) throw problem('malformed', 'Send one picture in the field “photo” and its place in the field “slot”.');
    return presentPhoto(await addPhoto(deps, intakeId, body.slot, request.file.buffer));
  }, { limit: 'photos' });

  bind(api, endpoints.removePhoto, async ({ intakeId, params }) => removePhoto(deps, intakeId, params.id));

  bind(api, endpoints.getPhoto, async ({ params, caller, response }) => {
    const photo = await visiblePhoto(deps, params.id, caller);
    const bytes = await deps.storage.get(params.size === 'thumb' ? photo.thumbKey : photo.storageKey);
    if (!bytes) throw problem('unavailable', 'This photo cannot be shown right now.');
    response.set({ 'Content-Type': 'image/jpeg', 'Content-Disposition': 'inline', 'Cache-Control': 'private, max-age=3600' }).send(bytes);
  });
}
