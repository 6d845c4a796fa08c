import OctagonAlert from 'lucide-react-native/icons/octagon-alert';
import { useEffect, useRef } from 'react';
import { Pressable, StyleSheet, View } from 'react-native';
import { border, colors, radius, space, targetPx } from '../theme/tokens';
import { focusField } from './focus-field';
import { Glyph } from './glyph';
import { Text } from './text';

export interface ErrorSummaryProps {
  /** One entry a problem; same words as at the field. `field` is the field's id. */
  readonly problems: readonly { readonly field: string; readonly detail: string }[];
  /** Grows with each press of Next, so that a second failed press takes the focus again. */
  readonly attempt?: number;
}

const COUNTS = ['', 'One answer', 'Two answers', 'Three answers', 'Four answers', 'Five answers'];

/** Box at the top of a step after a failed Next: it takes focus, and each line leads to its field. */
export function ErrorSummary({ problems, attempt = 1 }: ErrorSummaryProps) {
  const box = useRef<View>(null);
  const some = problems.length > 0;
  useEffect(() => {
    if (some) box.current?.focus();
  }, [some, attempt]);
  if (!some) return null;
  return (
    <View ref={box} role="alert" tabIndex={-1} dataSet={{ control: 'message' }} style={styles.box}>
      <View style={styles.head}>
        <Glyph of={OctagonAlert} size={24} color="stop" />
        <Text variant="subheading" color="stop" level={2}>{`${COUNTS[problems.length] ?? `${problems.length} answers`} to fix`}</Text>
      </View>
      {problems.map((problem) => (
        <Pressable key={problem.field} role="button" onPress={() => focusField(problem.field)} style={styles.line}>
          <Text variant="note" weight={700} style={{ textDecorationLine: 'underline' }}>{problem.detail}</Text>
        </Pressable>
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  box: {
    padding: space[4], borderWidth: border.chosen, borderColor: colors.stop, borderRadius: radius.button, backgroundColor: colors.card,
  },
  head: { flexDirection: 'row', gap: space[2], alignItems: 'center', paddingBottom: space[2] },
  line: { minHeight: targetPx, justifyContent: 'center', borderTopWidth: border.hair, borderColor: colors.rule, paddingVertical: space[2] },
});
