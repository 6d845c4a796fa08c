import { createHash, createHmac, randomBytes, timingSafeEqual } from 'node:crypto';

/** A secret of 256 random bits, fit for a cookie or an address. */
export const newToken = (): string => randomBytes(32).toString('base64url');

/** What is stored of a token. A fast hash is enough: nobody guesses 256 bits. */
export const hashOf = (token: string): Buffer => createHash('sha256').update(token).digest();

/** The CSRF token of a desk session follows from its cookie's token, which scripts cannot read. */
export const csrfTokenOf = (sessionToken: string): string => createHmac('sha256', sessionToken).update('tidyrun desk csrf').digest('base64url');

/** Compares without telling by its time where two texts part. */
export const sameText = (one: string, other: string): boolean => timingSafeEqual(hashOf(one), hashOf(other));
