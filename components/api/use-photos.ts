import { useMutation, useQueryClient } from '@tanstack/react-query';
import { removePhoto, type Intake } from '../../shared/api/intakes';
import { request } from './client';
import { intakeKey } from './use-intake';

/** Takes a picture back. */
export function useRemovePhoto() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (id: string) => request(removePhoto, { params: { id } }),
    onSuccess: async (_, id) => {
      client.setQueryData<Intake>(intakeKey, (intake) => intake && { ...intake, photos: intake.photos.filter((photo) => photo.id !== id) });
      await client.invalidateQueries({ queryKey: intakeKey });
    },
  });
}
