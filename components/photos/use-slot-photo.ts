import { useQueryClient } from '@tanstack/react-query';
import { useRef, useState } from 'react';
import type { Intake, Photo } from '../../shared/api/intakes';
import type { PhotoSlotId } from '../../shared/wizard/index';
import { isProblem } from '../api/client';
import { useRemovePhoto } from '../api/use-photos';
import { intakeKey } from '../api/use-intake';
import { pickPhoto, type PhotoOrigin } from './pick-photo';
import { uploadFailure } from './photo-words';
import { shrinkImage } from './shrink-image';
import { uploadPhoto } from './upload-photo';

export interface SlotPhoto {
  /** Percent sent while a picture is on its way; null otherwise. */
  readonly percent: number | null;
  /** Why the last picture did not arrive. */
  readonly failure: string | null;
  readonly removing: boolean;
  readonly take: (origin: PhotoOrigin) => void;
  /** True when a picture that did not get through is kept here. */
  readonly canRepeat: boolean;
  /** Sends the kept picture once more. */
  readonly again: () => void;
  readonly remove: () => void;
}

/** Takes, shrinks and sends the picture of one slot; a new one replaces the old one after it has arrived. */
export function useSlotPhoto(slot: PhotoSlotId, current: Photo | undefined): SlotPhoto {
  const client = useQueryClient();
  const removal = useRemovePhoto();
  const [percent, setPercent] = useState<number | null>(null);
  const [failure, setFailure] = useState<string | null>(null);
  const [kept, setKept] = useState<Blob | null>(null);
  const busy = useRef(false);

  const deliver = async (picture: Blob) => {
    if (busy.current) return;
    busy.current = true;
    setKept(null);
    setFailure(null);
    setPercent(0);
    try {
      const photo = await uploadPhoto(slot, await shrinkImage(picture), setPercent);
      client.setQueryData<Intake>(intakeKey, (intake) => intake && { ...intake, photos: [...intake.photos, photo] });
      if (current) await removal.mutateAsync(current.id);
      await client.invalidateQueries({ queryKey: intakeKey });
    } catch (error) {
      setFailure(uploadFailure(error));
      // A picture that was refused would be refused again; only one that did not arrive is worth another try.
      if (!isProblem(error, 413, 415, 422)) setKept(picture);
    } finally {
      busy.current = false;
      setPercent(null);
    }
  };

  return {
    percent,
    failure,
    removing: removal.isPending,
    take: (origin) => {
      if (busy.current) return;
      pickPhoto(origin).then((picture) => (picture ? deliver(picture) : undefined), (error: unknown) => setFailure(uploadFailure(error)));
    },
    canRepeat: kept !== null && percent === null,
    again: () => { if (kept) void deliver(kept); },
    remove: () => {
      setFailure(null);
      setKept(null);
      if (current) removal.mutate(current.id, { onError: (error) => setFailure(uploadFailure(error)) });
    },
  };
}
