import { Redirect } from 'expo-router';
import { firstOpenStep } from '../../shared/wizard/index';
import { isProblem } from '../api/client';
import { GonePage, OpenFailedPage, OpeningPage } from './opening-pages';
import { useWizard } from './wizard-context';

/** Where the wizard was left: the first step with something to answer. */
export function StartScreen() {
  const { intake, answers, openError, openAgain } = useWizard();
  if (isProblem(openError, 401, 404, 410)) return <GonePage />;
  if (openError) return <OpenFailedPage error={openError} onAgain={openAgain} />;
  if (!intake) return <OpeningPage title="Your answers" />;
  return <Redirect href={`/quote/${firstOpenStep(answers).id}`} />;
}
