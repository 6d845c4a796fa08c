import OctagonAlert from 'lucide-react-native/icons/octagon-alert';
import Cable from 'lucide-react-native/icons/cable';
import { View } from 'react-native';
import { feetInWords, inchesInWords } from '../../shared/units';
import type { PlanDrawing } from '../../shared/quote';
import { GaragePlan } from '../plan/garage-plan';
import { space } from '../theme/tokens';
import { EmptyState } from '../ui/empty-state';
import { Glyph } from '../ui/glyph';
import { Text } from '../ui/text';
import { useWizard } from './wizard-context';

/** The most that the plan may take: on a phone the questions under it have to show. */
const HEIGHT_PX = { phone: 310, tablet: 480, wide: 560 } as const;

/** The measured plan as far as it is known, what is wrong on it, and how the cable reaches. */
export function PlanPane({ size = 'phone' }: { size?: keyof typeof HEIGHT_PX }) {
  const { intake } = useWizard();
  const plan = intake?.range.plan;
  const problems = intake?.range.planProblems ?? [];
  if (!plan) return <EmptyState title="Your plan appears here" note="Type the width and the depth. We draw the garage and the run as you go." />;
  return (
    <View style={{ gap: space[3] }}>
      <GaragePlan plan={plan} maxHeightPx={HEIGHT_PX[size]} legend={size === 'wide'} />
      {problems.map((words) => (
        <View key={words} style={{ flexDirection: 'row', gap: space[2] }}>
          <Glyph of={OctagonAlert} color="stop" />
          <Text variant="note" weight={700} color="stop" style={{ flex: 1 }}>{words}</Text>
        </View>
      ))}
      <View role="status" style={{ flexDirection: 'row', gap: space[2] }}>
        <Glyph of={Cable} color={plan.cable.reaches ? 'ink2' : 'stop'} />
        <Text variant="note" weight={700} color={plan.cable.reaches ? 'ink2' : 'stop'} style={{ flex: 1 }}>{cableWords(plan)}</Text>
      </View>
    </View>
  );
}

/** "Cable: about 12 of 18 ft. Charger 45 in. up.", or how much it is short and what helps. */
export const cableWords = ({ cable, cableLengthFt, charger }: PlanDrawing): string =>
  cable.reaches
    ? `Cable: about ${Math.round(cable.usedFt)} of ${feetInWords(cableLengthFt)}. Charger ${inchesInWords(charger.heightIn)} up.`
    : `The cable is ${feetInWords(Math.max(1, Math.ceil(cable.shortFt)))} short. Move the charger, or park the other way round.`;
