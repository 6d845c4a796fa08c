import { G, Path, Rect, Text as SvgText } from 'react-native-svg';
import { family } from '../theme/fonts';
import { colors } from '../theme/tokens';

const SHELL = '#E6E2D3';
const INNER = '#C9CFC8';
const DOOR = '#D9D6C7';

const ROWS = [0, 1, 2, 3, 4, 5, 6, 7] as const;

/** A panel with its hinged door open and the cover on, 131 x 140, door at the left. Decoration for pictures. */
export function PanelOpen({ transform, thin = false }: { readonly transform: string; readonly thin?: boolean }) {
  const edge = { stroke: colors.ink, strokeWidth: thin ? 1.6 : 2.2, strokeLinejoin: 'round' } as const;
  return (
    <G transform={transform}>
      <Rect x={59} y={10} width={74} height={124} rx={5} fill={colors.ink} fillOpacity={0.16} />
      <Path d="M1 2.5Q1 1 2.5 1.2L56 9V131L2.5 139.2Q1 139.5 1 138Z" fill={DOOR} {...edge} />
      <Path d="M9 15l40 4v98l-40 5z" fill={colors.card} />
      <Path d="M29 17v103" stroke={colors.rule} strokeWidth={1} />
      {ROWS.map((row) => (
        <G key={row}>
          <Path d={`M13 ${27 + row * 12}l12 1`} stroke={row === 2 || row === 6 ? colors.copper : colors.ink2} strokeWidth={1.6} strokeLinecap="round" />
          <Path d={`M32 ${28.5 + row * 11.6}l12 0.6`} stroke={row === 1 || row === 5 ? colors.copper : colors.ink2} strokeWidth={1.6} strokeLinecap="round" />
        </G>
      ))}
      <Rect x={56} y={8} width={74} height={123} rx={5} fill={SHELL} {...edge} />
      <Rect x={62} y={15} width={62} height={109} rx={3} fill={INNER} />
      <Rect x={79} y={20} width={28} height={17} rx={3} fill={colors.ink} />
      <Rect x={85} y={22.5} width={16} height={12} rx={2.5} fill={colors.card} />
      <SvgText x={93} y={31} fontSize={6.5} fontFamily={family[800]} fill={colors.ink} textAnchor="middle">200</SvgText>
      <Rect x={91.2} y={41} width={3.6} height={79} rx={1.5} fill={colors.live} />
      {ROWS.map((row) => {
        const y = 42 + row * 9.7;
        const lit = row > 5;
        return (
          <G key={row}>
            <Rect x={66} y={y} width={23} height={7.4} rx={1.6} fill={lit ? colors.copper : colors.spruce} />
            <Rect x={80} y={y + 1.7} width={6} height={4} rx={1.2} fill={colors.card} />
            <Rect x={97} y={y} width={23} height={7.4} rx={1.6} fill={colors.spruce} />
            <Rect x={row === 6 ? 109 : 100} y={y + 1.7} width={6} height={4} rx={1.2} fill={colors.card} />
          </G>
        );
      })}
    </G>
  );
}
