import { Circle, G, Rect } from 'react-native-svg';
import { colors } from '../theme/tokens';

/** A wall charger from the front, 56 x 86 with its pipe fitting on top. */
export function ChargerUnit({ transform }: { readonly transform: string }) {
  return (
    <G transform={transform}>
      <Rect x={17} y={0} width={22} height={12} rx={3} fill={colors.spruceDeep} />
      <Rect x={1} y={9} width={54} height={75} rx={14} fill={colors.spruce} stroke={colors.spruceDeep} strokeWidth={2.4} />
      <Rect x={15} y={23} width={26} height={7} rx={3.5} fill={colors.liveDark} />
      <Circle cx={28} cy={56} r={11} fill={colors.spruceDeep} stroke={colors.mist} strokeWidth={2} />
    </G>
  );
}
