import type { PlanDrawing } from '../../shared/quote';
import type { PointFt, Wall } from './plan-geometry';

/** How the room lies on the sheet, px. */
export interface View {
  readonly widthPx: number;
  readonly heightPx: number;
  /** Px a foot. */
  readonly scale: number;
  /** The room's inner corner back left. */
  readonly left: number;
  readonly top: number;
  readonly wallPx: number;
  readonly compact: boolean;
  readonly px: (point: PointFt) => PointFt;
}

const MARGIN = { full: { side: 42, top: 40, bottom: 42 }, compact: { side: 4, top: 4, bottom: 4 } } as const;

/** Fits the room into the width at hand and the height allowed. */
export function fitView({ room }: PlanDrawing, widthPx: number, maxHeightPx: number, compact: boolean): View {
  const margin = compact ? MARGIN.compact : MARGIN.full;
  // Walls are 6 in. thick, drawn outside of the room's inner measures.
  const byWidth = (widthPx - 2 * margin.side) / (room.widthFt + 1);
  const byHeight = (maxHeightPx - margin.top - margin.bottom) / (room.depthFt + 1);
  const scale = Math.max(2, Math.min(byWidth, byHeight));
  const wallPx = Math.max(4, scale / 2);
  const left = (widthPx - room.widthFt * scale) / 2;
  const top = margin.top + wallPx;
  return {
    widthPx, scale, left, top, wallPx, compact,
    heightPx: top + room.depthFt * scale + wallPx + margin.bottom,
    px: ({ x, y }) => ({ x: left + x * scale, y: top + y * scale }),
  };
}

/** A rectangle on the wall itself: from `fromFt` along it, `lengthFt` long, `overPx` more than the wall is thick on each side. */
export function onWallBox(view: View, room: PlanDrawing['room'], wall: Wall, fromFt: number, lengthFt: number, overPx = 0): { x: number; y: number; width: number; height: number } {
  const { scale, left, top, wallPx } = view;
  const across = wallPx + 2 * overPx;
  const along = lengthFt * scale;
  if (wall === 'back') return { x: left + fromFt * scale, y: top - wallPx - overPx, width: along, height: across };
  if (wall === 'front') return { x: left + fromFt * scale, y: top + room.depthFt * scale - overPx, width: along, height: across };
  const x = wall === 'left' ? left - wallPx - overPx : left + room.widthFt * scale - overPx;
  return { x, y: top + fromFt * scale, width: across, height: along };
}
