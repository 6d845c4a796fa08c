import { createContext, useContext } from 'react';
import type { Intake } from '../../shared/api/intakes';
import type { Answers } from '../../shared/wizard/index';
import type { SaveState } from './answer-queue';
import type { RangeStand } from './range-change';

export interface Wizard {
  /** Undefined until the server answered for the first time. */
  readonly intake: Intake | undefined;
  /** Why the intake could not be opened; null while all is well. */
  readonly openError: unknown;
  readonly openAgain: () => void;
  /** What is on the screen: saved answers and over them those on their way. */
  readonly answers: Answers;
  readonly save: SaveState;
  /** The server's reasons against single answers. */
  readonly refused: Readonly<Record<string, string>>;
  /** Keeps an answer: sent at once, or `waitMs` after the last change. null takes it back. */
  readonly answer: (id: string, value: unknown, waitMs?: number) => void;
  /** Shows an answer that is half typed or out of its limits; it is not sent. */
  readonly hold: (id: string, value: unknown) => void;
  /** Sends what waits; true once all of it is saved, false when it is not (yet). */
  readonly flush: () => Promise<boolean>;
  /** The range before its last change. */
  readonly rangeBefore: RangeStand | null;
}

export const WizardContext = createContext<Wizard | null>(null);

/** The wizard's answers and what follows from them. @throws Error outside the wizard's provider. */
export function useWizard(): Wizard {
  const wizard = useContext(WizardContext);
  if (!wizard) throw new Error('useWizard belongs inside WizardProvider');
  return wizard;
}
