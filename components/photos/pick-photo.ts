/** Where a picture comes from: the camera, or what is already on the device. */
export type PhotoOrigin = 'camera' | 'files';

/** Loads the pickers ahead, so that the tap on the button still counts as the one that opens them. */
export const readyPickers = (): Promise<unknown> => Promise.all([import('expo-image-picker'), import('expo-document-picker')]);

/** Lets the person take or choose one picture. Null when they change their mind. */
export async function pickPhoto(origin: PhotoOrigin): Promise<Blob | null> {
  if (origin === 'camera') {
    const { launchCameraAsync } = await import('expo-image-picker');
    const picked = await launchCameraAsync({ mediaTypes: ['images'], exif: false });
    return picked.assets?.[0]?.file ?? null;
  }
  const { getDocumentAsync } = await import('expo-document-picker');
  const picked = await getDocumentAsync({ type: 'image/*', base64: false });
  return picked.assets?.[0]?.file ?? null;
}
