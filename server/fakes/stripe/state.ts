import type Stripe from 'stripe';
import { randomBytes } from 'node:crypto';
import { mkdirSync, readFileSync, renameSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';

/** A session with what the payment page needs beside it. */
export interface StoredSession {
  readonly session: Stripe.Checkout.Session;
  readonly lineName: string;
  /** Metadata for the payment intent, as given in `payment_intent_data`. */
  readonly intentMetadata: Stripe.Metadata;
  /** Tries of the card that needs a second one. */
  tries: number;
  /** Words of the last refusal, shown on the page until the next try. */
  refusal: string | null;
}

export interface Delivery { readonly eventId: string; attempts: number; nextAt: number; done: boolean }
export interface Replay { readonly path: string; readonly paramsHash: string; readonly status: number; readonly body: string }

export interface FakeState {
  readonly sessions: Record<string, StoredSession>;
  readonly paymentIntents: Record<string, Stripe.PaymentIntent>;
  readonly charges: Record<string, Stripe.Charge>;
  readonly refunds: Record<string, Stripe.Refund>;
  readonly events: Stripe.Event[];
  readonly deliveries: Delivery[];
  readonly replays: Record<string, Replay>;
}

export interface Store {
  readonly state: FakeState;
  /** Writes the state so that a restart finds it. */
  readonly save: () => void;
}

const nothing = (): FakeState => ({ sessions: {}, paymentIntents: {}, charges: {}, refunds: {}, events: [], deliveries: [], replays: {} });

/** The state kept in `dataDir`, or an empty one. A half-written file cannot appear: it is renamed into place. */
export function openStore(dataDir: string): Store {
  mkdirSync(dataDir, { recursive: true });
  const file = join(dataDir, 'state.json');
  let state = nothing();
  try {
    state = { ...state, ...(JSON.parse(readFileSync(file, 'utf8')) as FakeState) };
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code !== 'ENOENT') throw error;
  }
  const save = () => {
    writeFileSync(`${file}.new`, JSON.stringify(state));
    renameSync(`${file}.new`, file);
  };
  return { state, save };
}

/** "cs_test_" and the like with 24 letters and digits after it. */
export const newId = (prefix: string): string => `${prefix}${randomBytes(18).toString('base64url').replace(/[-_]/g, 'x')}`;

export const seconds = (at: Date): number => Math.floor(at.getTime() / 1000);
