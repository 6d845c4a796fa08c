import { useQueryClient } from '@tanstack/react-query';
import { useEffect, useMemo, useState, useSyncExternalStore, type ReactNode } from 'react';
import { useIntake } from '../api/use-intake';
import { createAnswerQueue, withUnsaved } from './answer-queue';
import { LiveMessage } from './live-message';
import { watchPage } from './page-events';
import { sendAnswers } from './send-answers';
import { useRangeChange } from './use-range-change';
import { WizardContext, type Wizard } from './wizard-context';

const NONE = {};

/** Holds the intake of this browser and saves each answer as it is given. */
export function WizardProvider({ children }: { children: ReactNode }) {
  const client = useQueryClient();
  const { data: intake, error, refetch } = useIntake();
  const [queue] = useState(() => createAnswerQueue({ send: (answers, leaving) => sendAnswers(client, answers, leaving) }));
  const state = useSyncExternalStore(queue.subscribe, queue.state, queue.state);
  const { before, message } = useRangeChange(intake?.range);
  const opened = intake !== undefined;

  useEffect(() => {
    if (opened) queue.open();
  }, [opened, queue]);

  useEffect(() => {
    const unwatch = watchPage({ onLeave: queue.leave, onOnline: () => void queue.flush() });
    return () => {
      unwatch();
      queue.stop();
    };
  }, [queue]);

  const wizard = useMemo<Wizard>(() => ({
    intake,
    openError: intake ? null : error,
    openAgain: () => void refetch(),
    answers: withUnsaved(intake?.answers ?? NONE, state.unsaved),
    save: state.save,
    refused: state.refused,
    answer: queue.set,
    hold: queue.hold,
    flush: queue.flush,
    rangeBefore: before,
  }), [intake, error, refetch, state, queue, before]);

  return (
    <WizardContext.Provider value={wizard}>
      {children}
      <LiveMessage words={message} />
    </WizardContext.Provider>
  );
}
