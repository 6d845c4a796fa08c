import X from 'lucide-react-native/icons/x';
import { useEffect, useRef, type ReactNode } from 'react';
import { Pressable, ScrollView, StyleSheet, View } from 'react-native';
import { border, colors, radius, shadow, space, targetPx } from '../theme/tokens';
import { Glyph } from './glyph';
import { Text } from './text';

export interface DrawerProps {
  readonly open: boolean;
  readonly title: string;
  readonly note?: string;
  readonly onClose: () => void;
  /** Pinned at the bottom. */
  readonly actions?: ReactNode;
  readonly children: ReactNode;
}

/** A side sheet that leaves the page usable; the whole window on a phone. Opening moves the focus in; the caller gives it back on close. */
export function Drawer({ open, title, note, onClose, actions, children }: DrawerProps) {
  const panel = useRef<View>(null);
  useEffect(() => {
    if (open) panel.current?.focus();
  }, [open]);
  if (!open) return null;
  return (
    <View
      ref={panel} role="complementary" aria-label={title} tabIndex={-1} dataSet={{ part: 'drawer', control: 'message' }} style={styles.drawer}
      onKeyDown={(event) => { if (event.key === 'Escape') onClose(); }}
    >
      <View style={styles.head}>
        <View style={{ flex: 1 }}>
          <Text variant="heading" level={2}>{title}</Text>
          {note ? <Text variant="note" color="ink2">{note}</Text> : null}
        </View>
        <Pressable role="button" aria-label={`Close ${title}`} onPress={onClose} style={styles.close}><Glyph of={X} /></Pressable>
      </View>
      <ScrollView style={{ flex: 1 }} contentContainerStyle={{ padding: space[4], gap: space[4] }}>{children}</ScrollView>
      {actions ? <View style={styles.actions}>{actions}</View> : null}
    </View>
  );
}

const styles = StyleSheet.create({
  drawer: { position: 'absolute', top: 0, right: 0, bottom: 0, width: 396, maxWidth: '100%', backgroundColor: colors.card, boxShadow: shadow.sheet, zIndex: 20 },
  head: { flexDirection: 'row', gap: space[3], padding: space[4], borderBottomWidth: border.hair, borderColor: colors.rule },
  close: { width: targetPx, height: targetPx, borderRadius: radius.small, borderWidth: border.quiet, borderColor: colors.edge, alignItems: 'center', justifyContent: 'center' },
  actions: { flexDirection: 'row', flexWrap: 'wrap', gap: space[2], padding: space[4], borderTopWidth: border.hair, borderColor: colors.rule },
});
