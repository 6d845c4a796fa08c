import Svg, { Circle, Path, Rect } from 'react-native-svg';
import { colors } from '../theme/tokens';

/** The mark: a rounded square panel with one conduit run in an S of two sweeps. `light`: on spruce. */
export function BrandMark({ size = 36, light = false }: { readonly size?: number; readonly light?: boolean }) {
  const [panel, end] = light ? [colors.paper, colors.ink] : [colors.spruce, colors.paper];
  return (
    <Svg width={size} height={size} viewBox="0 0 36 36" aria-hidden>
      <Rect width={36} height={36} rx={10} fill={panel} />
      <Path d="M9.5 11H14a4 4 0 0 1 4 4v6a4 4 0 0 0 4 4h4.5" fill="none" stroke={light ? colors.copper : colors.liveDark} strokeWidth={5} />
      <Circle cx={9} cy={11} r={3} fill={end} />
      <Circle cx={27} cy={25} r={3} fill={end} />
    </Svg>
  );
}
