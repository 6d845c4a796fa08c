import TriangleAlert from 'lucide-react-native/icons/triangle-alert';
import { View } from 'react-native';
import { space } from '../theme/tokens';
import { Glyph } from './glyph';
import { Text } from './text';

/** The ids of a control's hint and error, for `aria-describedby`; undefined when it has neither. */
export const describedBy = (id: string, hint: string | undefined, error: string | null | undefined): string | undefined =>
  [hint ? `${id}-hint` : '', error ? `${id}-error` : ''].filter(Boolean).join(' ') || undefined;

/** The line between a label and its control. */
export function Hint({ id, children }: { readonly id: string; readonly children: string }) {
  return <Text variant="note" weight={500} color="ink2" nativeID={`${id}-hint`}>{children}</Text>;
}

/** What is wrong, under the control: a triangle and words. */
export function FieldError({ id, children }: { readonly id: string; readonly children: string }) {
  return (
    <View nativeID={`${id}-error`} style={{ flexDirection: 'row', gap: space[2], alignItems: 'flex-start' }}>
      <View style={{ paddingTop: 1 }}><Glyph of={TriangleAlert} size={18} color="stop" /></View>
      <Text variant="note" weight={700} color="stop" style={{ flexShrink: 1 }}>{children}</Text>
    </View>
  );
}
