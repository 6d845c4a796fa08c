import ArrowLeft from 'lucide-react-native/icons/arrow-left';
import { View } from 'react-native';
import { space } from '../theme/tokens';
import { Button } from '../ui/button';
import { ButtonLink } from '../ui/button-link';
import type { StepState } from './use-step';

/** The square way back. A link, so that nothing is lost and it works like any other. */
export const BackLink = ({ state }: { state: StepState }) => <ButtonLink kind="back" icon={ArrowLeft} label={state.back.label} href={state.back.href} />;

/** `short`: "Next" alone, where it shares its line with the range. */
export function NextButton({ state, grow = true, short = false }: { state: StepState; grow?: boolean; short?: boolean }) {
  return <Button label={short ? 'Next' : state.next.label} spokenLabel={short ? `Next. ${state.next.label}` : state.next.label} arrow busy={state.busy} busyLabel="Saving" onPress={state.goOn} grow={grow} />;
}

/** Back and Next in words, at the foot of a wide step. */
export function StepNav({ state }: { state: StepState }) {
  return (
    <View style={{ flexDirection: 'row', flexWrap: 'wrap', gap: space[3] }}>
      <ButtonLink kind="quiet" icon={ArrowLeft} label={state.back.label} href={state.back.href} />
      <View style={{ minWidth: 250 }}><NextButton state={state} /></View>
    </View>
  );
}
