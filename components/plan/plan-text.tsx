import { Text as SvgText } from 'react-native-svg';
import { family, type Weight } from '../theme/fonts';
import { colors, type ColorName } from '../theme/tokens';

interface Props {
  readonly x: number;
  readonly y: number;
  readonly children: string;
  readonly color?: ColorName;
  readonly weight?: Weight;
  readonly size?: number;
  readonly anchor?: 'start' | 'middle' | 'end';
  /** A rim of the floor's color, for words that may lie over lines. */
  readonly halo?: boolean;
  /** Degrees, round the place of the words. */
  readonly turn?: number;
}

/** Words on the plan. */
export function PlanText({ x, y, children, color = 'ink', weight = 700, size = 13, anchor = 'middle', halo = false, turn = 0 }: Props) {
  const place = { x, y, fontSize: size, fontFamily: family[weight], textAnchor: anchor, ...(turn ? { transform: `rotate(${turn} ${x} ${y})` } : {}) };
  return (
    <>
      {halo ? <SvgText {...place} fill={colors.card} stroke={colors.card} strokeWidth={4}>{children}</SvgText> : null}
      <SvgText {...place} fill={colors[color]}>{children}</SvgText>
    </>
  );
}
