import type { LucideIcon } from 'lucide-react-native';
import Check from 'lucide-react-native/icons/check';
import { useEffect, useState } from 'react';
import { Pressable, StyleSheet, View } from 'react-native';
import { colors, radius, space, targetPx } from '../theme/tokens';
import { Glyph } from './glyph';
import { Text } from './text';

export interface ToastProps {
  /** One sentence; null: nothing to say. */
  readonly message: string | null;
  readonly onClose: () => void;
  readonly icon?: LucideIcon;
  /** With it the toast stays until it is closed. */
  readonly action?: { readonly label: string; readonly onPress: () => void };
}

const STAYS_MS = 6_000;

/** An ink bar, one at a time; never for errors that need an answer. Without an action it goes after 6 s, unless the focus is in it. */
export function Toast({ message, onClose, icon = Check, action }: ToastProps) {
  const [held, setHeld] = useState(false);
  const goes = message !== null && !action && !held;
  useEffect(() => {
    if (!goes) return undefined;
    const timer = setTimeout(onClose, STAYS_MS);
    return () => clearTimeout(timer);
  }, [goes, onClose]);
  return (
    <View role="status" aria-live="polite" dataSet={{ part: 'toast' }} style={styles.place}>
      {message === null ? null : (
        <View dataSet={{ surface: 'dark' }} style={styles.bar} onFocus={() => setHeld(true)} onBlur={() => setHeld(false)}>
          <Glyph of={icon} color="copperPale" />
          <Text variant="note" weight={700} color="paper" style={{ flex: 1 }}>{message}</Text>
          {action ? (
            <Pressable role="button" onPress={action.onPress} style={styles.action}><Text variant="note" weight={800} color="copperPale">{action.label}</Text></Pressable>
          ) : null}
          <Pressable role="button" aria-label="Close this message" onPress={onClose} style={styles.action}><Text variant="note" weight={800} color="copperPale">Close</Text></Pressable>
        </View>
      )}
    </View>
  );
}

const styles = StyleSheet.create({
  place: { position: 'absolute', left: space[4], right: space[4], bottom: space[4], zIndex: 30, pointerEvents: 'box-none' },
  bar: { flexDirection: 'row', alignItems: 'center', gap: space[3], maxWidth: 480, backgroundColor: colors.ink, borderRadius: radius.button, paddingLeft: space[4], paddingRight: space[2], minHeight: 52 },
  action: { minHeight: targetPx, minWidth: targetPx, alignItems: 'center', justifyContent: 'center' },
});
