import type { Answers } from '../../shared/wizard/index';

export type SaveState = 'saved' | 'waiting' | 'saving' | 'failed' | 'gone';

export interface QueueState {
  readonly save: SaveState;
  /** What this page knows beyond the server: not sent yet, on the way, held back, or refused. null takes an answer back. */
  readonly unsaved: Answers;
  /** What the server said about single answers it refused; they stay on the screen. */
  readonly refused: Readonly<Record<string, string>>;
}

/** How one attempt to save ended. `refused`: these answers, for these reasons; the others were not saved either. */
export type SendResult = { readonly kind: 'saved' } | { readonly kind: 'refused'; readonly fields: Readonly<Record<string, string>> } | { readonly kind: 'failed' } | { readonly kind: 'gone' };

interface Options {
  readonly send: (answers: Answers, leaving: boolean) => Promise<SendResult>;
  readonly retryAfterMs?: readonly number[];
}

const without = <T,>(map: Readonly<Record<string, T>>, ids: readonly string[]) =>
  Object.fromEntries(Object.entries(map).filter(([id]) => !ids.includes(id)));

export interface AnswerQueue {
  /** The intake is there: from now on answers are sent; those given before wait for this. */
  readonly open: () => void;
  readonly state: () => QueueState;
  readonly subscribe: (listener: () => void) => () => void;
  /** Keeps an answer and sends it after `waitMs` without another; 0 sends at once. */
  readonly set: (id: string, value: unknown, waitMs?: number) => void;
  /** Keeps an answer on the screen without sending it: it is half typed or out of its limits. */
  readonly hold: (id: string, value: unknown) => void;
  /** Sends what waits. True when all of it is saved, false when it is not (yet). */
  readonly flush: () => Promise<boolean>;
  /** The page is being left: one last request that may outlive it. */
  readonly leave: () => void;
  readonly stop: () => void;
}

const RETRY_MS = [1_500, 4_000, 10_000, 20_000] as const;

/**
 * Saves answers in the order they were given, one request at a time. A failed request loses nothing: its answers go back in
 * front of the line (newer ones win) and are tried again. Answers that the server refuses stay on the screen with its reason.
 */
export function createAnswerQueue({ send, retryAfterMs = RETRY_MS }: Options): AnswerQueue {
  let waiting: Answers = {};
  let sending: Answers = {};
  let held: Answers = {};
  let refused: Readonly<Record<string, string>> = {};
  let save: SaveState = 'saved';
  let failures = 0;
  let opened = false;
  let timer: ReturnType<typeof setTimeout> | undefined;
  let running: Promise<void> | null = null;
  let snapshot: QueueState = { save, unsaved: {}, refused };
  const listeners = new Set<() => void>();

  const tell = () => {
    snapshot = { save, unsaved: { ...sending, ...waiting, ...held }, refused };
    listeners.forEach((listener) => listener());
  };
  const forget = (id: string) => {
    held = without(held, [id]);
    refused = without(refused, [id]);
  };
  const later = (ms: number) => {
    clearTimeout(timer);
    timer = setTimeout(() => void flush(), ms);
  };

  const settle = (result: SendResult) => {
    if (result.kind === 'saved') {
      failures = 0;
      save = Object.keys(waiting).length > 0 ? 'waiting' : 'saved';
    } else if (result.kind === 'refused') {
      const ids = Object.keys(result.fields);
      // What was given anew in the meantime is not what was refused.
      const old = [...Object.keys(waiting), ...Object.keys(held)];
      held = { ...without(Object.fromEntries(Object.entries(sending).filter(([id]) => ids.includes(id))), old), ...held };
      refused = { ...refused, ...without(result.fields, old) };
      waiting = { ...without(sending, ids), ...waiting };
      save = Object.keys(waiting).length > 0 ? 'waiting' : 'saved';
    } else {
      waiting = { ...sending, ...waiting };
      save = result.kind;
    }
    sending = {};
    tell();
    if (result.kind === 'failed') later(retryAfterMs[Math.min(failures++, retryAfterMs.length - 1)] ?? 20_000);
  };

  const run = async () => {
    while (Object.keys(waiting).length > 0) {
      sending = waiting;
      waiting = {};
      save = 'saving';
      tell();
      const result = await send(sending, false);
      settle(result);
      if (result.kind === 'failed' || result.kind === 'gone') break;
    }
    // Here and not in a `finally`, which would run later: an answer given in between would wait for nobody.
    running = null;
  };
  const flush = async (): Promise<boolean> => {
    clearTimeout(timer);
    if (opened && !running && Object.keys(waiting).length > 0) running = run();
    await running;
    return Object.keys(waiting).length === 0 && save === 'saved';
  };

  return {
    open: () => {
      opened = true;
      void flush();
    },
    state: () => snapshot,
    subscribe: (listener) => {
      listeners.add(listener);
      return () => { listeners.delete(listener); };
    },
    set: (id, value, waitMs = 0) => {
      waiting = { ...waiting, [id]: value };
      forget(id);
      if (save === 'saved') save = 'waiting';
      tell();
      if (save === 'gone') return;
      if (waitMs > 0) later(waitMs);
      else void flush();
    },
    hold: (id, value) => {
      waiting = without(waiting, [id]);
      forget(id);
      held = { ...held, [id]: value };
      if (Object.keys(waiting).length === 0 && (save === 'waiting' || save === 'failed')) save = 'saved';
      tell();
    },
    flush,
    leave: () => {
      const rest = { ...sending, ...waiting };
      if (opened && Object.keys(rest).length > 0) void send(rest, true);
    },
    stop: () => clearTimeout(timer),
  };
}

/** The answers as this page shows them: what the server has, and over it what it does not have yet. */
export const withUnsaved = (saved: Answers, unsaved: Answers): Answers => {
  const merged = { ...saved, ...unsaved };
  return Object.fromEntries(Object.entries(merged).filter(([, value]) => value !== null && value !== undefined));
};
