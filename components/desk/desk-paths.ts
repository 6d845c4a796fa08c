/** Where to go after signing in: a page of the desk only, whatever the address says. */
export const pathAfterSignIn = (next: string | undefined): string => (next && /^\/desk\/(?!sign-in)[\w/?=&.-]*$/.test(next) ? next : '/desk/leads');

/** The sign-in page that leads back to `path`. */
export const signInPath = (path: string): string => (path.startsWith('/desk/') ? `/desk/sign-in?next=${encodeURIComponent(path)}` : '/desk/sign-in');
