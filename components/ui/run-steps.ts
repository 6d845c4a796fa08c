import type { Href } from 'expo-router';
import type { RunState } from '../drawings/run-parts';

export interface RunStep {
  readonly id: string;
  readonly label: string;
  /** What was answered; stands under a finished step. */
  readonly summary?: string;
  /** Where a finished step can be changed. */
  readonly href?: Href;
  readonly state: RunState;
}

const STATE_WORDS: Readonly<Record<RunState, string>> = { done: 'done', now: 'now', todo: 'to come' };

/** "Step 2, Car, done" */
export const spokenStep = (step: RunStep, index: number): string => `Step ${index + 1}, ${step.label}, ${STATE_WORDS[step.state]}`;
