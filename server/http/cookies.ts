import type { Request, Response } from 'express';

export const cookieNames = { intake: 'tidyrun_intake', my: 'tidyrun_my', desk: 'tidyrun_desk' } as const;
export type CookieName = keyof typeof cookieNames;

/** The token in one of our cookies; null when it is not there or cannot be one. */
export function readCookie(request: Request, name: CookieName): string | null {
  for (const part of (request.headers.cookie ?? '').split(';')) {
    const at = part.indexOf('=');
    if (at > 0 && part.slice(0, at).trim() === cookieNames[name]) {
      const value = part.slice(at + 1).trim();
      return /^[\w-]{43}$/.test(value) ? value : null;
    }
  }
  return null;
}

const options = (https: boolean) => ({ httpOnly: true, sameSite: 'lax', path: '/api', secure: https }) as const;

/** `maxAgeMs` absent: until the browser is closed. */
export const setCookie = (response: Response, name: CookieName, token: string, https: boolean, maxAgeMs?: number): void => {
  response.cookie(cookieNames[name], token, { ...options(https), ...(maxAgeMs === undefined ? {} : { maxAge: maxAgeMs }) });
};

export const clearCookie = (response: Response, name: CookieName, https: boolean): void => {
  response.clearCookie(cookieNames[name], options(https));
};
