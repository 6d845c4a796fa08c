import { randomUUID } from 'node:crypto';
import type { Photo as PhotoSeen } from '../../shared/api/intakes';
import type { Deps } from '../deps';
import { problem } from '../http/problem';
import { readIntake } from '../intakes/read-intake';
import type { Photo } from '../models/photo';
import { encodePicture } from './encode-picture';

export const MAX_PHOTOS = 20;

const tooMany = () => problem('conflict', `${MAX_PHOTOS} photos at most. Take one back first.`);

/**
 * Keeps a picture for an intake. Its files are stored before its row, so that whatever is acknowledged can be read.
 * @throws problems of encodePicture; conflict when there are too many
 */
export async function addPhoto({ sequelize, models, storage, clock }: Deps, intakeId: string, slot: PhotoSeen['slot'], bytes: Buffer): Promise<Photo> {
  const standing = () => models.Photo.count({ where: { intakeId, removedAt: null } });
  if (await standing() >= MAX_PHOTOS) throw tooMany();
  const { full, thumb, ...seen } = await encodePicture(bytes);
  const id = randomUUID();
  const keys = { storageKey: `photos/${id}/full.jpg`, thumbKey: `photos/${id}/thumb.jpg` };
  const forget = () => Promise.all([storage.remove(keys.storageKey), storage.remove(keys.thumbKey)]);
  try {
    await storage.put(keys.storageKey, full);
    await storage.put(keys.thumbKey, thumb);
    return await sequelize.transaction(async (transaction) => {
      await readIntake(models, intakeId, transaction, true);
      if (await models.Photo.count({ where: { intakeId, removedAt: null }, transaction }) >= MAX_PHOTOS) throw tooMany();
      return models.Photo.create({ id, intakeId, slot, ...seen, ...keys, bytes: full.length, createdAt: clock() }, { transaction });
    });
  } catch (error) {
    await forget().catch(() => {}); // the reason to tell of is the first one
    throw error;
  }
}

/** Takes a picture back and removes its files. @throws problem not-found when it is not this intake's */
export async function removePhoto({ models, storage, clock, logger }: Deps, intakeId: string, id: string): Promise<void> {
  const photo = await models.Photo.findOne({ where: { id, intakeId, removedAt: null } });
  if (!photo) throw problem('not-found');
  await photo.update({ removedAt: clock() });
  for (const key of [photo.storageKey, photo.thumbKey]) {
    await storage.remove(key).catch(() => logger.warn({ photoId: id }, 'photos: a file that was taken back is still there'));
  }
}
