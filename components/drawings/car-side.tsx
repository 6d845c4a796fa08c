import { Circle, Ellipse, G, Path, Rect } from 'react-native-svg';
import { colors } from '../theme/tokens';

const UPPER = '#3E7596';
const GLASS = '#E4ECF0';
const TYRE = '#1D2B2E';
const RIM = '#D5DAD4';

/** A car from the side, 216 x 82, nose left, its charge port near the tail at 184, 45. */
export function CarSide({ transform }: { readonly transform: string }) {
  return (
    <G transform={transform}>
      <Ellipse cx={108} cy={76} rx={111} ry={5} fill={colors.ink} fillOpacity={0.18} />
      <Path d="M0 46c0-9 6-13 18-15.5l28-5C61 8 80 0 107 0h24c24 0 38 11 52 26l20 5.5c9 2.5 13 7 13 14V58c0 4-2 6-6 6H6c-4 0-6-2-6-6z" fill={UPPER} />
      <Path d="M0 46c0-3 .6-5 2-7 40-2 70-1 106-1h106c1.4 2 2 4.5 2 7.5V58c0 4-2 6-6 6H6c-4 0-6-2-6-6z" fill={colors.lake} />
      <Path d="M57 28C70 12 84 6.5 105 6.5V27c-20 2.5-34 3-48 1z" fill={GLASS} />
      <Path d="M112 6.5h19c18 0 31 8 43 21-20 2-42 2.5-62 .5z" fill={GLASS} />
      <Path d="M67 26l12-13M123 25l14-15" stroke={colors.white} strokeWidth={3} strokeLinecap="round" />
      <Path d="M108.5 4v58" stroke="#1F4660" strokeWidth={1.4} />
      <Rect x={117} y={35.5} width={13} height={2.6} rx={1.3} fill="#1F4660" />
      <Rect x={0} y={45} width={14} height={5.2} rx={2.2} fill={colors.blade} />
      <Rect x={205} y={43.5} width={11} height={6.4} rx={2.2} fill={colors.liveDark} />
      <Rect x={180.5} y={34} width={9} height={9.4} rx={2.4} fill={colors.card} stroke="#1F4660" strokeWidth={1} />
      {[43, 170].map((x) => (
        <G key={x}>
          <Circle cx={x} cy={63} r={17} fill={TYRE} />
          <Circle cx={x} cy={63} r={9.5} fill={RIM} />
          <Circle cx={x} cy={63} r={3} fill={TYRE} />
        </G>
      ))}
    </G>
  );
}
