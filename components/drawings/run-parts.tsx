import { Circle, G, Path, Rect, Text as SvgText } from 'react-native-svg';
import { family } from '../theme/fonts';
import { colors } from '../theme/tokens';

export type RunState = 'done' | 'now' | 'todo';

/** One box of the run: check disc when done, square with its number now, empty ring to come. */
export function RunBox({ x, y, state, mark }: { readonly x: number; readonly y: number; readonly state: RunState; readonly mark: string }) {
  if (state === 'todo') return <Circle cx={x} cy={y} r={6.5} fill={colors.card} stroke={colors.edge} strokeWidth={2} />;
  if (state === 'done') {
    return (
      <G>
        <Circle cx={x} cy={y} r={9} fill={colors.copper} stroke={colors.paper} strokeWidth={1.5} />
        <Path d={`M${x - 3.6} ${y + 0.2}l2.6 2.7 4.8-5.2`} fill="none" stroke={colors.white} strokeWidth={2.2} strokeLinecap="round" strokeLinejoin="round" />
      </G>
    );
  }
  return (
    <G>
      <Rect x={x - 11.5} y={y - 11.5} width={23} height={23} rx={6.5} fill={colors.card} stroke={colors.ink} strokeWidth={2.5} />
      {mark === '' ? <Circle cx={x} cy={y} r={4} fill={colors.copper} /> : (
        <SvgText x={x} y={y + 4.6} fontSize={13} fontFamily={family[800]} fill={colors.ink} textAnchor="middle">{mark}</SvgText>
      )}
    </G>
  );
}

/** The panel at the start of the run, 30 x 38, its upper left corner at x, y. */
export function RunPanel({ x, y }: { readonly x: number; readonly y: number }) {
  return (
    <G transform={`translate(${x} ${y})`}>
      <Rect width={30} height={38} rx={5} fill={colors.spruce} />
      <Path d="M6 9h6M6 15.5h6M6 22h6M6 28.5h6M18 9h6M18 15.5h6M18 22h6M18 28.5h6" stroke={colors.paper} strokeWidth={2.6} strokeLinecap="round" />
      <Path d="M15 6v26" stroke={colors.liveDark} strokeWidth={2.6} strokeLinecap="round" />
    </G>
  );
}

/** The car at its end, 44 x 30, its upper left corner at x, y; copper once all is done. */
export function RunCar({ x, y, done = false }: { readonly x: number; readonly y: number; readonly done?: boolean }) {
  const body = done ? colors.live : colors.lake;
  return (
    <G transform={`translate(${x} ${y})`}>
      <Path d="M2 24v-8c0-2.5 1.5-4 4-4.6L9 11l3.5-7.5C13.3 1.7 14.6 1 16.5 1h10c2 0 3.6.8 4.7 2.5L35.5 11l4 1c2.6.7 4 2 4 4.5V22c0 1.5-.8 2.3-2.2 2.3H4C2.6 24.3 2 24 2 24z" fill={body} />
      <Path d="M15.8 5.2L13 11h8V4.5h-4.2c-.5 0-.8.2-1 .7zM23.5 4.5V11H32l-3.6-5.8c-.3-.5-.7-.7-1.3-.7z" fill={colors.lakeWash} />
      <Circle cx={11} cy={24.5} r={5} fill={colors.ink} /><Circle cx={11} cy={24.5} r={1.8} fill={colors.mist} />
      <Circle cx={34} cy={24.5} r={5} fill={colors.ink} /><Circle cx={34} cy={24.5} r={1.8} fill={colors.mist} />
    </G>
  );
}
