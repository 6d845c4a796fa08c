import Check from 'lucide-react-native/icons/check';
import { View } from 'react-native';
import { border, colors, radius } from '../theme/tokens';
import { Glyph } from './glyph';

/** The box of a checkbox: a picture, the real one is beside it. */
export function CheckMark({ checked, wrong }: { readonly checked: boolean; readonly wrong: boolean }) {
  return (
    <View
      aria-hidden
      style={{
        width: 26, height: 26, flexShrink: 0, borderRadius: radius.tag, alignItems: 'center', justifyContent: 'center',
        borderWidth: wrong ? border.chosen : border.quiet, borderColor: wrong ? colors.stop : checked ? colors.copper : colors.edge,
        backgroundColor: checked ? colors.copper : colors.card,
      }}
    >
      {checked ? <Glyph of={Check} size={18} color="white" /> : null}
    </View>
  );
}
