import LogOut from 'lucide-react-native/icons/log-out';
import { Pressable, StyleSheet, View } from 'react-native';
import { colors, radius, space } from '../theme/tokens';
import { Glyph } from '../ui/glyph';
import { Text } from '../ui/text';

export interface Leave {
  readonly busy: boolean;
  readonly failed: boolean;
  readonly onPress: () => void;
}

/** Signs out; on spruce. `folded`: the glyph alone, its words only spoken. */
export function LeaveButton({ leave, folded = false }: { readonly leave: Leave; readonly folded?: boolean }) {
  const words = leave.failed ? 'Not signed out, try again' : 'Sign out';
  return (
    <View>
      <Pressable role="button" aria-label={words} aria-busy={leave.busy} aria-disabled={leave.busy} onPress={() => { if (!leave.busy) leave.onPress(); }}
        style={({ pressed }) => [styles.button, folded && styles.folded, pressed && { backgroundColor: colors.spruceDeep }]}>
        <Glyph of={LogOut} size={18} color="mist" />
        {folded ? null : <Text variant="note" weight={700} color="paper" style={{ flexShrink: 1 }}>{words}</Text>}
      </Pressable>
      {folded && leave.failed ? <Text role="alert" variant="fine" color="paper">Try again</Text> : null}
    </View>
  );
}

const styles = StyleSheet.create({
  button: { flexDirection: 'row', alignItems: 'center', gap: space[2], minHeight: 44, paddingHorizontal: space[3], borderRadius: radius.small },
  folded: { width: 44, justifyContent: 'center', paddingHorizontal: 0 },
});
