import { stepIds } from '../../shared/wizard/index';

/** The steps that get a static page each at export. */
export const stepParams = (): { step: string }[] => stepIds.filter((id) => id !== 'price').map((step) => ({ step }));
