/** Whether a media query holds. Off the web there are none: always false. */
export const useMedia = (_query: string): boolean => false;
