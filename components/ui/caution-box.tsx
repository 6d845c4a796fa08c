import Info from 'lucide-react-native/icons/info';
import OctagonAlert from 'lucide-react-native/icons/octagon-alert';
import TriangleAlert from 'lucide-react-native/icons/triangle-alert';
import { useEffect, useRef, type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { colors, radius, space } from '../theme/tokens';
import { Glyph } from './glyph';
import { HazardEdge } from './hazard-edge';
import { Text } from './text';

export interface CautionBoxProps {
  /** caution: stripes and triangle. stop: octagon, with a way out. note: calm, not a caution. */
  readonly level: 'caution' | 'stop' | 'note';
  readonly title?: string;
  /** One or two sentences, from the approved wordings. */
  readonly children: ReactNode;
  /** A phone number, a way out. */
  readonly action?: ReactNode;
  /** For a stop box that appears after an answer: it takes the focus. */
  readonly focusOnMount?: boolean;
}

const LOOKS = {
  caution: { icon: TriangleAlert, ink: 'warn', wash: colors.warnWash },
  stop: { icon: OctagonAlert, ink: 'stop', wash: colors.stopWash },
  note: { icon: Info, ink: 'lake', wash: colors.lakeWash },
} as const;

/** A caution stands before what it guards and can never be closed. */
export function CautionBox({ level, title, children, action, focusOnMount = false }: CautionBoxProps) {
  const box = useRef<View>(null);
  useEffect(() => {
    if (focusOnMount) box.current?.focus();
  }, [focusOnMount]);
  const { icon, ink, wash } = LOOKS[level];
  return (
    <View ref={box} role="note" {...(focusOnMount ? { tabIndex: -1 as const } : {})} dataSet={{ control: 'message' }} style={[styles.box, { backgroundColor: wash }, level === 'caution' && styles.striped]}>
      {level === 'caution' ? <HazardEdge /> : null}
      <View style={{ paddingTop: 1 }}><Glyph of={icon} size={22} color={ink} /></View>
      <View style={styles.words}>
        {title ? <Text weight={800}>{title}</Text> : null}
        {typeof children === 'string' ? <Text weight={600}>{children}</Text> : children}
        {action}
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  box: { flexDirection: 'row', gap: space[3], borderRadius: radius.field, paddingVertical: space[3], paddingHorizontal: space[4], overflow: 'hidden' },
  striped: { paddingLeft: 28 },
  words: { flex: 1, gap: space[1] },
});
