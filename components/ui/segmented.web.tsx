import { useId } from 'react';
import { View } from 'react-native';
import { SegmentFace, segmentFrame } from './segment-face';
import type { SegmentedProps } from './segmented';

/** One of a few views of the same thing: real radios. */
export function Segmented({ label, options, value, onChange }: SegmentedProps) {
  const name = useId();
  return (
    <View role="radiogroup" aria-label={label} style={segmentFrame}>
      {options.map((option) => (
        <label key={option.value} className="ui-choice ui-segment">
          <input type="radio" className="ui-input" name={name} value={option.value} checked={option.value === value} onChange={() => onChange(option.value)} />
          <SegmentFace label={option.label} chosen={option.value === value} />
        </label>
      ))}
    </View>
  );
}
