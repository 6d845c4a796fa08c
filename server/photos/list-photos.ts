import type { Photo as PhotoSeen } from '../../shared/api/intakes';
import type { Models } from '../models/index';
import type { PhotoColumns } from '../models/photo';

export const presentPhoto = ({ id, slot, widthPx, heightPx, verdict }: PhotoColumns): PhotoSeen => ({
  id, slot, widthPx, heightPx, verdict, thumbUrl: `/api/photos/${id}/thumb`, url: `/api/photos/${id}/full`,
});

/** The pictures of an intake that were not taken back, oldest first. */
export async function listPhotos(models: Models, intakeId: string): Promise<PhotoSeen[]> {
  const photos = await models.Photo.findAll({ where: { intakeId, removedAt: null }, order: [['createdAt', 'ASC'], ['id', 'ASC']] });
  return photos.map(presentPhoto);
}
