import Svg, { Path } from 'react-native-svg';
import { colors, type ColorName } from '../theme/tokens';

/** One path a load, on the 24 px grid, 2 px strokes: what a homeowner would recognize in the house. */
const PATHS: Readonly<Record<string, string>> = {
  range: 'M5 4h14a1 1 0 0 1 1 1v14a1 1 0 0 1-1 1H5a1 1 0 0 1-1-1V5a1 1 0 0 1 1-1zM4 10h16M8 7h.01M12 7h.01M16 7h.01M8 14h8v3H8z',
  dryer: 'M6 3h12a1 1 0 0 1 1 1v16a1 1 0 0 1-1 1H6a1 1 0 0 1-1-1V4a1 1 0 0 1 1-1zM12 9a5 5 0 1 0 0 10 5 5 0 0 0 0-10M8.5 6h.01M12 6h.01',
  centralAir: 'M12 12c0-4-1-8 2-9s4 4-2 9c4 0 8-1 9 2s-4 4-9-2c0 4 1 8-2 9s-4-4 2-9c-4 0-8 1-9-2s4-4 9 2',
  waterHeater: 'M8 3h8a2 2 0 0 1 2 2v14a2 2 0 0 1-2 2H8a2 2 0 0 1-2-2V5a2 2 0 0 1 2-2zM12 8c2 2.5 3 3.8 3 5.2a3 3 0 0 1-6 0C9 11.8 10 10.5 12 8z',
  heatPump: 'M4 6h16a1 1 0 0 1 1 1v10a1 1 0 0 1-1 1H4a1 1 0 0 1-1-1V7a1 1 0 0 1 1-1zM9 8.5a3.5 3.5 0 1 0 0 7 3.5 3.5 0 0 0 0-7M15 10h3M15 14h3M6 18v2M18 18v2',
  stripHeat: 'M4 20V8a2 2 0 0 1 4 0v8a2 2 0 0 0 4 0V8a2 2 0 0 1 4 0v8a2 2 0 0 0 4 0V4',
  roomHeaters: 'M4 7h16v9H4zM8 7v9M12 7v9M16 7v9M6 16v4M18 16v4',
  spa: 'M3 13h18v2a5 5 0 0 1-5 5H8a5 5 0 0 1-5-5zM8 10c-1.5-1.5 1.5-3 0-5M12 10c-1.5-1.5 1.5-3 0-5M16 10c-1.5-1.5 1.5-3 0-5',
  otherCharger: 'M7 3h7a2 2 0 0 1 2 2v8a2 2 0 0 1-2 2H7a2 2 0 0 1-2-2V5a2 2 0 0 1 2-2zM8 6h5M10.5 15v3a3 3 0 0 0 6 0v-1a2 2 0 0 1 4 0v3',
  poolPump: 'M3 18c2 0 2-1.5 4.5-1.5S10 18 12 18s2-1.5 4.5-1.5S19 18 21 18M3 13c2 0 2-1.5 4.5-1.5S10 13 12 13s2-1.5 4.5-1.5S19 13 21 13M8 11V6a2 2 0 0 1 4 0M15 11V6a2 2 0 0 1 4 0',
  instantWaterHeater: 'M7 3h10a1 1 0 0 1 1 1v12a1 1 0 0 1-1 1H7a1 1 0 0 1-1-1V4a1 1 0 0 1 1-1zM9 17v4M15 17v4M12 7c1.5 1.8 2 2.6 2 3.6a2 2 0 0 1-4 0c0-1 .5-1.8 2-3.6z',
  workshop: 'M4 20l9-9M14 4l6 6-3 3-6-6zM4 20l2 .5',
  wallOven: 'M5 3h14v18H5zM5 8h14M8 5.5h.01M12 5.5h4M8 12h8v5H8z',
  cooktop: 'M4 5h16v14H4zM8.5 7.5a1.5 1.5 0 1 0 0 3 1.5 1.5 0 0 0 0-3M15.5 7.5a1.5 1.5 0 1 0 0 3 1.5 1.5 0 0 0 0-3M8.5 13.5a1.5 1.5 0 1 0 0 3 1.5 1.5 0 0 0 0-3M15.5 13.5a1.5 1.5 0 1 0 0 3 1.5 1.5 0 0 0 0-3',
  dishwasher: 'M5 3h14v18H5zM5 8h14M8 5.5h.01M12 11v2M9 17a3 3 0 0 1 6 0',
  disposal: 'M3 6h18M6 6v4a6 6 0 0 0 12 0V6M12 16v5M9 21h6',
  microwave: 'M3 6h18v12H3zM15 6v12M6 9h6v6H6zM18 9h.01M18 12h.01M18 15h.01',
  wellPump: 'M6 21V10a3 3 0 0 1 3-3h5V3h3v8h-3v-1M10 21h-6M17 14c1 1.3 1.5 2 1.5 2.8a1.5 1.5 0 0 1-3 0c0-.8.5-1.5 1.5-2.8z',
  sumpPump: 'M4 12v8h16v-8M12 4v9M8.5 7.5L12 4l3.5 3.5M7 16c1.5 0 1.5-1 2.5-1s1 1 2.5 1 1.5-1 2.5-1 1 1 2.5 1',
};

/** The glyph of a big load (shared/loads.ts); nothing for an unknown one. */
export function LoadGlyph({ id, size = 18, color = 'ink' }: { readonly id: string; readonly size?: number; readonly color?: ColorName }) {
  const path = PATHS[id];
  if (!path) return null;
  return (
    <Svg width={size} height={size} viewBox="0 0 24 24" aria-hidden>
      <Path d={path} fill="none" stroke={colors[color]} strokeWidth={size < 18 ? 2.3 : 2} strokeLinecap="round" strokeLinejoin="round" />
    </Svg>
  );
}
