import CloudOff from 'lucide-react-native/icons/cloud-off';
import { View } from 'react-native';
import { colors, radius, space } from '../theme/tokens';
import { Glyph } from '../ui/glyph';
import { Text } from '../ui/text';
import { TextButton } from '../ui/text-button';
import { useWizard } from './wizard-context';

/** Says when answers have not reached us: they stay on the page, and are tried again by themselves or at once. */
export function SaveNote() {
  const { save, flush } = useWizard();
  const failed = save === 'failed';
  return (
    <View role="status">
      {failed ? (
        <View style={{ flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', columnGap: space[3], paddingHorizontal: space[4], backgroundColor: colors.well, borderRadius: radius.field }}>
          <Glyph of={CloudOff} color="ink2" />
          <Text variant="note" style={{ flexGrow: 1, flexBasis: 200, paddingVertical: space[2] }}>No connection. Your answers are kept on this page and sent when it is back.</Text>
          <TextButton label="Try now" variant="note" onPress={() => void flush()} />
        </View>
      ) : null}
    </View>
  );
}
