import { G, Path } from 'react-native-svg';
import { colors } from '../theme/tokens';

interface Props {
  readonly d: string;
  /** Outer width of the pipe. */
  readonly width?: number;
  /** Drawn up to this length of the path; all of it by default. */
  readonly filledTo?: number;
  /** Total length, needed with `filledTo`. */
  readonly length?: number;
  /** Draws the empty pipe under the copper. */
  readonly empty?: boolean;
}

/** A run of conduit along a path: empty pipe in outline, and copper in it as far as it is done. Sweeps are part of the path. */
export function Conduit({ d, width = 10, filledTo, length = 0, empty = false }: Props) {
  const dash = filledTo === undefined ? undefined : `${filledTo} ${length + 10}`;
  const line = { d, fill: 'none', strokeLinejoin: 'round' } as const;
  return (
    <G>
      {empty ? (
        <>
          <Path {...line} stroke={colors.edge} strokeWidth={width} />
          <Path {...line} stroke={colors.card} strokeWidth={width - 3} />
        </>
      ) : null}
      {filledTo === 0 ? null : (
        <>
          <Path {...line} stroke={colors.copperDeep} strokeWidth={width} strokeDasharray={dash} />
          <Path {...line} stroke={colors.live} strokeWidth={width - 2.5} strokeDasharray={dash} />
          <Path {...line} stroke={colors.copperPale} strokeWidth={Math.max(1, width * 0.14)} strokeDasharray={dash} />
        </>
      )}
    </G>
  );
}
