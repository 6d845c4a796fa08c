import Svg, { Circle, Path, Rect, Text as SvgText } from 'react-native-svg';
import { family } from '../theme/fonts';
import { colors } from '../theme/tokens';

const STROKE = { fill: 'none', stroke: colors.ink3, strokeWidth: 1.6, strokeLinejoin: 'round', strokeLinecap: 'round' } as const;

/** What each of the five photos should show, on a 120 x 70 sheet. */
function Ghost({ slot }: { readonly slot: string }) {
  switch (slot) {
    case 'panel':
      return (
        <>
          <Path d="M34 14l24-3v48l-24-3z" {...STROKE} strokeDasharray="4 3" />
          <Rect x={58} y={11} width={30} height={48} rx={3} {...STROKE} />
          <Rect x={66} y={16} width={14} height={8} rx={2} {...STROKE} />
          <Path d="M64 30h7M64 36h7M64 42h7M64 48h7M75 30h7M75 36h7M75 42h7M75 48h7M40 24l12-1M40 32l12-1M40 40h12M40 48l12 1" {...STROKE} />
        </>
      );
    case 'label':
      return (
        <>
          <Rect x={36} y={14} width={48} height={42} rx={5} {...STROKE} strokeDasharray="4 3" />
          <Rect x={50} y={20} width={20} height={17} rx={4} {...STROKE} />
          <SvgText x={60} y={32} fontSize={9} fontFamily={family[800]} fill={colors.ink3} textAnchor="middle">200</SvgText>
          <Path d="M43 44h34M43 50h20" {...STROKE} />
        </>
      );
    case 'wall':
      return (
        <>
          <Path d="M14 58h92M42 12v46M78 12v46" {...STROKE} strokeDasharray="4 3" />
          <Rect x={52} y={22} width={16} height={22} rx={5} {...STROKE} />
          <Circle cx={60} cy={35} r={3.5} {...STROKE} />
        </>
      );
    case 'meter':
      return (
        <>
          <Circle cx={60} cy={28} r={15} {...STROKE} />
          <Path d="M52 26h16v6H52zM46 40h28v18H46zM60 58v6" {...STROKE} />
        </>
      );
    default:
      return (
        <>
          <Path d="M14 60l22-16V16h48v28l22 16M36 44h48" {...STROKE} strokeDasharray="4 3" />
          <Rect x={42} y={24} width={9} height={12} rx={1.5} {...STROKE} />
          <Path d="M51 28h18a4 4 0 0 1 4 4v6" {...STROKE} stroke={colors.live} strokeWidth={2.4} />
          <Rect x={70} y={37} width={7} height={9} rx={2} {...STROKE} />
        </>
      );
  }
}

/** The right picture in outline, with the corners of a viewfinder. */
export function PhotoGhost({ slot, wanted = false }: { readonly slot: string; readonly wanted?: boolean }) {
  return (
    <Svg width="100%" height="100%" viewBox="0 0 120 70" aria-hidden>
      <Ghost slot={slot} />
      <Path d="M20 14V6h8M92 6h8v8M100 56v8h-8M28 64h-8v-8" fill="none" stroke={wanted ? colors.copper : colors.edge} strokeWidth={2.4} />
    </Svg>
  );
}
