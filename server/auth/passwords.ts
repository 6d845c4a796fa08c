import { hash, verify } from '@node-rs/argon2';

// OWASP's password storage cheat sheet: argon2id (the library's default) with 19 MiB, two passes, one lane.
const cost = { memoryCost: 19_456, timeCost: 2, parallelism: 1 } as const;

/** The text to store for a password; salt and cost are in it. */
export const hashPassword = (password: string): Promise<string> => hash(password, cost);

let decoy: Promise<string> | undefined;

/**
 * Whether a password is right. Without a stored hash it costs the same and is always false, so that nobody learns from the time
 * whether an account exists.
 */
export async function passwordIsRight(stored: string | null, password: string): Promise<boolean> {
  const against = stored ?? await (decoy ??= hashPassword('nobody has this password'));
  const right = await verify(against, password);
  return right && stored !== null;
}
