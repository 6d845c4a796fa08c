import Svg, { Defs, G, LinearGradient, Path, Rect, Stop, Text as SvgText } from 'react-native-svg';
import { family } from '../theme/fonts';
import { colors } from '../theme/tokens';
import { CarSide } from './car-side';
import { ChargerUnit } from './charger-unit';
import { Conduit } from './conduit';
import { PanelOpen } from './panel-open';

const BASEBOARD = '#8FA697';
const GROUND = '#B8AD96';
const SIDING = '#B9CDC1';
/** The wall goes on beyond the picture, to fill a frame of another shape. */
const OVER = 1200;

/** A garage wall from inside: siding, baseboard, floor. */
function Wall({ width, height, floor, lines, id }: { width: number; height: number; floor: number; lines: readonly number[]; id: string }) {
  const wide = width + 2 * OVER;
  return (
    <G>
      <Defs><LinearGradient id={id} x1="0" y1="0" x2="0" y2="1"><Stop offset="0" stopColor="#C3D6CA" /><Stop offset="1" stopColor={colors.sage} /></LinearGradient></Defs>
      <Rect x={-OVER} y={-OVER} width={wide} height={OVER} fill="#C3D6CA" />
      <Rect x={-OVER} width={wide} height={floor} fill={`url(#${id})`} />
      <Path d={lines.map((y) => `M${-OVER} ${y}h${wide}`).join('')} stroke={SIDING} strokeWidth={2} />
      <Rect x={-OVER} y={floor - 9} width={wide} height={9} fill={BASEBOARD} />
      <Rect x={-OVER} y={floor} width={wide} height={height - floor} fill={GROUND} />
    </G>
  );
}

/** The cable from the charger to the car's port, with its plug. */
function Cable({ d, width, plug }: { d: string; width: number; plug: string }) {
  return (
    <G>
      <Path d={d} fill="none" stroke={colors.spruceDeep} strokeWidth={width} strokeLinecap="round" />
      <G transform={plug}><Rect x={0} y={0} width={22} height={14} rx={6} fill={colors.spruceDeep} /></G>
    </G>
  );
}

/** Panel, run, charger and car, 390 x 320, for phones; the sheet of words covers its lowest 24 px. */
export function LandingPicturePhone() {
  return (
    <Svg width="100%" height="100%" viewBox="0 0 390 320" preserveAspectRatio="xMidYMax meet" style={{ overflow: 'visible' }} aria-hidden>
      <Wall width={390} height={320} floor={276} lines={[81, 142, 204]} id="wall-phone" />
      <Path d="M119 80V62a18 18 0 0 1 18-18H323a18 18 0 0 1 18 18V70" fill="none" stroke={colors.ink} strokeOpacity={0.13} strokeWidth={13} />
      <Conduit d="M112 80V58a22 22 0 0 1 22-22H312a22 22 0 0 1 22 22V80" width={14} />
      <Path d="M177 21v30M263 21v30M319 61h30" stroke={colors.spruceDeep} strokeWidth={6} strokeLinecap="round" />
      <Rect x={101} y={76} width={22} height={13} rx={3} fill={colors.spruceDeep} />
      <PanelOpen transform="translate(18 80)" />
      <CarSide transform="translate(110 196)" />
      <Cable d="M334 158C336 190 342 222 343 236c1 8-6 12-14 12-12 0-22 0-30-3" width={6} plug="translate(291 229)" />
      <ChargerUnit transform="translate(306 75)" />
    </Svg>
  );
}

/** The same with its measures, 800 x 560, for wide windows. */
export function LandingPictureWide() {
  const measure = { fontSize: 18, fontFamily: family[800], fill: colors.ink, textAnchor: 'middle' } as const;
  return (
    <Svg width="100%" height="100%" viewBox="0 0 800 560" preserveAspectRatio="xMinYMax meet" style={{ overflow: 'visible' }} aria-hidden>
      <Wall width={800} height={560} floor={486} lines={[42, 105, 167, 229, 291, 353, 416]} id="wall-wide" />
      <Path d="M197 33v14M669 33v14M197 40H400M466 40H669" stroke={colors.ink} strokeWidth={2} fill="none" />
      <SvgText x={433} y={46} {...measure}>{'25\u00a0ft'}</SvgText>
      <Path d="M180 112V98a26 26 0 0 1 26-26H676a26 26 0 0 1 26 26V324" fill="none" stroke={colors.ink} strokeOpacity={0.12} strokeWidth={14} />
      <Conduit d="M171 112V93a28 28 0 0 1 28-28H666a28 28 0 0 1 28 28V322" width={15} />
      <Path d="M237 53v25M368 53v25M499 53v25M630 53v25M682 196h25" stroke={colors.spruceDeep} strokeWidth={6} strokeLinecap="round" />
      <Rect x={160} y={104} width={22} height={14} rx={3} fill={colors.spruceDeep} />
      <PanelOpen transform="translate(32 104) scale(1.5)" thin />
      <CarSide transform="translate(190 343) scale(2.19)" />
      <Cable d="M694 400C694 432 704 444 709 454c3 6-2 10-10 10-44 2-90-3-104-10-8-4-8-10-4-14" width={6.5} plug="translate(588 423)" />
      <ChargerUnit transform="translate(666 318)" />
      <Path d="M735 364h14M735 486h14M742 364v32M742 454v32" stroke={colors.ink} strokeWidth={2} fill="none" />
      <SvgText x={748} y={425} {...measure} fontSize={17} transform="rotate(-90 748 425)">{'45\u00a0in.'}</SvgText>
    </Svg>
  );
}
