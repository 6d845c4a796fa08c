import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { steps } from '../../shared/wizard/index';
import { space } from '../theme/tokens';
import { ErrorSummary } from '../ui/error-summary';
import { FieldError } from '../ui/field-notes';
import { Page } from '../ui/page';
import { Plate } from '../ui/plate';
import { RunRail } from '../ui/run-rail';
import { Text } from '../ui/text';
import { FinishLater } from './finish-later';
import { runOfSteps } from './run-of-steps';
import { SaveToast } from './save-toast';
import type { StepState } from './use-step';
import { useWizard } from './wizard-context';

interface Props {
  readonly state: StepState;
  readonly title: string;
  readonly hint?: string;
  readonly focusKey: string;
  /** The middle column, under the title. */
  readonly children: ReactNode;
  /** The card column. */
  readonly side: ReactNode;
}

/** The wizard on wide windows: the run as a rail, the step in the middle, cards at the right. */
export function WideFrame({ state, title, hint, focusKey, children, side }: Props) {
  const { answers, intake } = useWizard();
  const { step } = state;
  return (
    <Page title={`${title} Step ${step.number} of ${steps.length}`} focusKey={focusKey} header={<FinishLater />}>
      <View style={styles.columns}>
        <RunRail steps={runOfSteps(step, answers, intake?.photos.length ?? 0, intake?.town ?? null)} />
        <View style={styles.middle}>
          <View style={{ gap: space[2] }}>
            <Plate number={step.number}>{step.short}</Plate>
            <Text variant="title" level={1}>{title}</Text>
            {hint ? <Text color="ink2">{hint}</Text> : null}
          </View>
          <ErrorSummary problems={state.problems} attempt={state.refusals} />
          {children}
          {state.obstacle ? <FieldError id="next">{state.obstacle}</FieldError> : null}
        </View>
        <View style={styles.side}>{side}</View>
      </View>
      <View dataSet={{ part: 'corner' }}><SaveToast /></View>
    </Page>
  );
}

const styles = StyleSheet.create({
  columns: { flexDirection: 'row', gap: 36, alignItems: 'flex-start', width: '100%', maxWidth: 1344, alignSelf: 'center' },
  middle: { flex: 1, minWidth: 0, gap: space[5] },
  side: { width: 372, gap: space[4] },
});
