import { View } from 'react-native';
import Svg, { Defs, Path, Pattern, Rect } from 'react-native-svg';
import { colors } from '../theme/tokens';

/** The striped ink-and-ochre edge that only cautions have; fills its parent's height. */
export function HazardEdge() {
  return (
    <View aria-hidden style={{ position: 'absolute', left: 0, top: 0, bottom: 0, width: 12 }}>
      <Svg width="100%" height="100%">
        <Defs>
          <Pattern id="hazard" width={20} height={20} patternUnits="userSpaceOnUse" patternTransform="rotate(-45)">
            <Rect width={20} height={20} fill={colors.hazard} />
            <Path d="M0 0h20v10H0z" fill={colors.ink} />
          </Pattern>
        </Defs>
        <Rect width="100%" height="100%" fill="url(#hazard)" />
      </Svg>
    </View>
  );
}
