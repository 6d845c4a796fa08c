import ChevronDown from 'lucide-react-native/icons/chevron-down';
import ChevronUp from 'lucide-react-native/icons/chevron-up';
import { useId, useState, type ReactNode } from 'react';
import { Pressable, View } from 'react-native';
import { space, targetPx } from '../theme/tokens';
import { Glyph } from './glyph';
import { Text } from './text';

export interface DisclosureProps {
  readonly label: string;
  /** When the label alone does not tell what opens ("Why"). */
  readonly spokenLabel?: string;
  readonly children: ReactNode;
}

/** More, for who wants it: a button that opens what stands under it. */
export function Disclosure({ label, spokenLabel, children }: DisclosureProps) {
  const [open, setOpen] = useState(false);
  const id = useId();
  return (
    <View>
      <Pressable role="button" aria-expanded={open} aria-controls={id} aria-label={spokenLabel ?? label} onPress={() => setOpen(!open)} style={{ flexDirection: 'row', gap: space[1], alignItems: 'center', minHeight: targetPx, alignSelf: 'flex-start' }}>
        <Text variant="note" color="lake" weight={700}>{label}</Text>
        <Glyph of={open ? ChevronUp : ChevronDown} size={18} color="lake" />
      </Pressable>
      <View id={id}>{open ? children : null}</View>
    </View>
  );
}
