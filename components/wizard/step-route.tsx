import { useLocalSearchParams } from 'expo-router';
import { stepById } from '../../shared/wizard/index';
import { NotFoundScreen } from '../not-found-screen';
import { StepScreen } from './step-screen';

/** The screen of the step that the address names; the price has a screen of its own. */
export function StepRoute() {
  const { step: id } = useLocalSearchParams<{ step: string }>();
  const step = stepById(id);
  return step && step.id !== 'price' ? <StepScreen step={step} /> : <NotFoundScreen />;
}
