import { addPhoto, type Photo } from '../../shared/api/intakes';
import type { PhotoSlotId } from '../../shared/wizard/index';
import { apiAddress, NetworkError, readAnswer } from '../api/client';

/**
 * Sends one picture. XMLHttpRequest, because fetch cannot tell how much has been sent.
 * @param onPercent told whole percents as they are sent
 * @throws ProblemError when the server refuses it, NetworkError when no answer comes
 */
export function uploadPhoto(slot: PhotoSlotId, picture: Blob, onPercent: (percent: number) => void): Promise<Photo> {
  return new Promise((resolve, reject) => {
    const form = new FormData();
    form.append('slot', slot);
    form.append('photo', picture, 'photo');
    const call = new XMLHttpRequest();
    call.open(addPhoto.method.toUpperCase(), apiAddress(addPhoto.path));
    call.setRequestHeader('Accept', 'application/json, application/problem+json');
    call.upload.onprogress = (event) => {
      if (event.lengthComputable) onPercent(Math.round((event.loaded / event.total) * 100));
    };
    call.onerror = () => reject(new NetworkError());
    call.onload = () => {
      try {
        resolve(readAnswer<Photo>(call.status, call.responseText));
      } catch (error) {
        reject(error instanceof Error ? error : new NetworkError());
      }
    };
    call.send(form);
  });
}
