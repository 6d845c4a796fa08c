import Check from 'lucide-react-native/icons/check';
import { View } from 'react-native';
import { space } from '../theme/tokens';
import { Glyph } from '../ui/glyph';
import { Text } from '../ui/text';
import { OutsideArea } from './outside-area';
import { useWizard } from './wizard-context';

/** What the ZIP means, as soon as it is saved: the town, or that we do not work there. */
export function ZipResult() {
  const { intake, answers } = useWizard();
  const zip = answers.zip;
  const known = typeof zip === 'string' && intake?.answers.zip === zip;
  if (known && intake.served === false) return <OutsideArea zip={zip} />;
  return (
    <View role="status" style={{ flexDirection: 'row', alignItems: 'center', gap: space[2], minHeight: 24 }}>
      {known && intake.served ? (
        <>
          <Glyph of={Check} color="ok" />
          <Text weight={700} color="ok">{intake.town ? `${intake.town}. We work there.` : 'We work there.'}</Text>
        </>
      ) : null}
    </View>
  );
}
