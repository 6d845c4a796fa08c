import Ruler from 'lucide-react-native/icons/ruler';
import { StyleSheet, View } from 'react-native';
import { dollarRange } from '../../shared/money';
import { feetInWords } from '../../shared/units';
import { Tape } from '../price/tape';
import { useLowWindow } from '../theme/use-breakpoint';
import { border, colors, radius, space } from '../theme/tokens';
import { Dock } from '../ui/dock';
import { Glyph } from '../ui/glyph';
import { StatusTag } from '../ui/status-tag';
import { Text } from '../ui/text';
import { rangeLine, standOf } from './range-change';
import { SaveToast } from './save-toast';
import { BackLink, NextButton } from './step-nav';
import type { StepState } from './use-step';
import { useWizard } from './wizard-context';

/** The step from which the range is shown: before it, too little is known for one. */
const SHOWN_FROM_STEP = 3;
const NO_RANGE = 'We can’t give a fair range for this one from here. A free visit can.';

/** Back and Next, and from the third step on the range on its tape with one line about it. */
export function RangeDock({ state }: { state: StepState }) {
  const { intake, rangeBefore } = useWizard();
  const range = intake?.range;
  const low = useLowWindow();
  const stand = standOf(range);
  const shown = range && state.step.number >= SHOWN_FROM_STEP && range.outcome !== 'too-early';
  const short = low && shown === true && stand !== null;
  const buttons = { above: <SaveToast />, back: <BackLink state={state} />, next: <NextButton state={state} short={short} /> };
  if (!shown) return <Dock {...buttons} />;
  const visit = range.outcome === 'visit';
  const total = range.outcome === 'firm' ? 'firm price' : 'likely total';
  const run = state.group?.drawing === 'plan' ? range.plan?.run : null;
  const line = visit ? (range.flags[0]?.words ?? NO_RANGE) : rangeLine(range, rangeBefore, state.step.id === 'photos');
  return (
    <Dock
      {...buttons}
      range={stand ? dollarRange(stand.lowCents, stand.highCents) : null}
      side={visit ? <StatusTag kind="visit" label="Needs a visit" /> : run ? <RunTag lengthFt={run.lengthFt} /> : total}
      tape={visit ? null : <Tape lowCents={range.lowCents} highCents={range.highCents} previous={rangeBefore} outcome={range.outcome} />}
      line={line && state.group?.drawing !== 'plan' ? (
        <View style={{ flexDirection: 'row', gap: space[2], alignItems: 'flex-start' }}>
          <Glyph of={Ruler} color={visit ? 'ink2' : 'copper'} />
          <Text variant="note" weight={700} color={visit ? 'ink2' : 'copper'} style={{ flex: 1 }}>{line}</Text>
        </View>
      ) : null}
    />
  );
}

/** How long the drawn run is, beside the range that follows from it. */
const RunTag = ({ lengthFt }: { lengthFt: number }) => (
  <View style={styles.tag}>
    <Text variant="note" weight={800} color="copper">{`${feetInWords(Math.round(lengthFt))} run`}</Text>
  </View>
);

const styles = StyleSheet.create({
  tag: {
    borderWidth: border.control, borderColor: colors.copper, borderRadius: radius.tag, paddingHorizontal: space[2], paddingVertical: 2,
  },
});
