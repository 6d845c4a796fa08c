import { useId, useState } from 'react';
import { View as Box } from 'react-native';
import Svg from 'react-native-svg';
import type { PlanDrawing } from '../../shared/quote';
import { Cable, Car, Reach, ReachWords } from './plan-car';
import { PlanLegend } from './plan-legend';
import { Floor, Walls } from './plan-room';
import { Dimensions, Fittings, Run } from './plan-run';
import { fitView } from './plan-view';
import { planInWords } from './plan-words';

export interface GaragePlanProps {
  readonly plan: PlanDrawing;
  readonly maxHeightPx?: number;
  /** A small picture without words and dimensions. */
  readonly compact?: boolean;
  readonly legend?: boolean;
}

/** Under this width words would run into each other. */
const COMPACT_UNDER_PX = 240;

/** The measured plan from above: room, doors, panel, charger, car, the cable's reach and the run. One picture with one spoken paragraph. */
export function GaragePlan({ plan, maxHeightPx = 620, compact = false, legend = false }: GaragePlanProps) {
  const [widthPx, setWidthPx] = useState(compact ? 140 : 358);
  const clipId = useId();
  const view = fitView(plan, widthPx, maxHeightPx, compact || widthPx < COMPACT_UNDER_PX);
  return (
    <Box style={{ width: '100%' }} onLayout={(event) => setWidthPx(event.nativeEvent.layout.width || widthPx)}>
      <Box role="img" aria-label={planInWords(plan)}>
        <Svg width={view.widthPx} height={view.heightPx} viewBox={`0 0 ${view.widthPx} ${view.heightPx}`} aria-hidden>
          <Floor plan={plan} view={view} />
          <Reach plan={plan} view={view} clipId={clipId} />
          <Car plan={plan} view={view} />
          <Walls plan={plan} view={view} />
          <ReachWords plan={plan} view={view} />
          <Run plan={plan} view={view} />
          <Cable plan={plan} view={view} />
          <Fittings plan={plan} view={view} />
          <Dimensions plan={plan} view={view} />
        </Svg>
      </Box>
      {legend ? <PlanLegend /> : null}
    </Box>
  );
}
