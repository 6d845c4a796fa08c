import { View } from 'react-native';
import Svg, { Path } from 'react-native-svg';
import { colors, type ColorName } from '../theme/tokens';

/** Three quarters of a ring that turns while something is being done; the style sheet holds it still with reduced motion. */
export function BusyRing({ color = 'ink' }: { color?: ColorName }) {
  return (
    <View dataSet={{ turning: 'yes' }} aria-hidden>
      <Svg width={20} height={20} viewBox="0 0 24 24">
        <Path d="M12 3a9 9 0 1 0 9 9" fill="none" stroke={colors[color]} strokeWidth={3} strokeLinecap="round" />
      </Svg>
    </View>
  );
}
