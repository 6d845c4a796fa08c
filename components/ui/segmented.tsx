import { Pressable, View } from 'react-native';
import { SegmentFace, segmentFrame } from './segment-face';

export interface SegmentedProps {
  readonly label: string;
  readonly options: readonly { readonly value: string; readonly label: string }[];
  readonly value: string;
  readonly onChange: (value: string) => void;
}

/** One of a few views of the same thing. */
export function Segmented({ label, options, value, onChange }: SegmentedProps) {
  return (
    <View role="radiogroup" aria-label={label} style={segmentFrame}>
      {options.map((option) => (
        <Pressable key={option.value} role="radio" aria-checked={option.value === value} aria-label={option.label} onPress={() => onChange(option.value)} style={{ flex: 1 }}>
          <SegmentFace label={option.label} chosen={option.value === value} />
        </Pressable>
      ))}
    </View>
  );
}
