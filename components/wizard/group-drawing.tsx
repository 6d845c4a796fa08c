import { View } from 'react-native';
import Svg, { Path } from 'react-native-svg';
import { CarSide } from '../drawings/car-side';
import { ChargerUnit } from '../drawings/charger-unit';
import { PanelDoorDrawing } from '../drawings/panel-door-drawing';
import { colors, radius } from '../theme/tokens';

/** The picture that helps to answer a group. */
export function GroupDrawing({ id }: { id: 'panel' | 'car' }) {
  if (id === 'panel') return <PanelDoorDrawing />;
  return (
    <View style={{ backgroundColor: colors.sage, borderRadius: radius.card, height: 128, overflow: 'hidden' }}>
      <Svg width="100%" height="100%" viewBox="0 0 358 128" aria-hidden>
        <ChargerUnit transform="translate(292 14)" />
        <CarSide transform="translate(40 40)" />
        <Path d="M318 98c-2 26-44 24-64 0-6-8-14-18-26-20" fill="none" stroke={colors.spruceDeep} strokeWidth={5} strokeLinecap="round" />
      </Svg>
    </View>
  );
}
