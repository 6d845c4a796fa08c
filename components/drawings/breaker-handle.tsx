import { StyleSheet, View } from 'react-native';
import { colors } from '../theme/tokens';

export type HandleState = 'on' | 'off' | 'unsure';

const KNOB_LEFT: Readonly<Record<HandleState, number>> = { off: 2.5, unsure: 11, on: 19.5 };

/** A breaker's handle, 40 x 22: left is off, right is on, in the middle and hollow is not sure. A picture; the control beside it tells. */
export function BreakerHandle({ state, dark = false }: { readonly state: HandleState; readonly dark?: boolean }) {
  const on = state === 'on';
  const quiet = dark ? colors.mist : colors.edge;
  const knob = on
    ? { backgroundColor: colors.white, borderColor: colors.white }
    : state === 'off'
      ? { backgroundColor: quiet, borderColor: quiet }
      : { backgroundColor: 'transparent', borderColor: dark ? colors.blade : colors.ink2 };
  return (
    <View
      aria-hidden
      style={[
        styles.slot,
        on && { backgroundColor: colors.copper, borderColor: colors.copper },
        !on && { backgroundColor: dark ? colors.spruceDeep : colors.card, borderColor: dark ? colors.edgeDark : colors.edge },
      ]}
    >
      <View dataSet={{ slides: 'handle' }} style={[styles.knob, knob, { left: KNOB_LEFT[state] }]} />
    </View>
  );
}

const styles = StyleSheet.create({
  slot: { width: 40, height: 22, borderRadius: 7, borderWidth: 2, flexShrink: 0 },
  knob: { position: 'absolute', top: 2, width: 14, height: 14, borderRadius: 4, borderWidth: 2.5 },
});
