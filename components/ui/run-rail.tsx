import { StyleSheet, View } from 'react-native';
import Svg, { G } from 'react-native-svg';
import { Conduit } from '../drawings/conduit';
import { RunBox, RunCar, RunPanel } from '../drawings/run-parts';
import { Anchor } from './anchor';
import type { RunStep } from './run-steps';
import { Text } from './text';

const TOP = 108;
const ROW = 86;
const LINE = 24;
const JOG = 24;
const SWEEP = 12;
const QUARTER = (Math.PI / 2) * SWEEP;

/** The pipe down the rail: it jogs out to meet the current box, and back. `filledTo`: its length as far as that box. */
function pipe(count: number, at: number): { d: string; filledTo: number; length: number } {
  const last = TOP + (count - 1) * ROW;
  const end = last + 62;
  const tail = `V${end - SWEEP * 1.5}a18 18 0 0 0 18 18H74`;
  const straight = end - 60 + 60;
  if (at < 0) return { d: `M${LINE} 58${tail}`, filledTo: 0, length: straight };
  const y = TOP + at * ROW;
  const out = `a12 12 0 0 0 12 12a12 12 0 0 1 12 12`;
  const back = `a12 12 0 0 1 -12 12a12 12 0 0 0 -12 12`;
  return {
    d: `M${LINE} 58V${y - 38}${out}V${y + 14}${at === count - 1 ? '' : `${back}`}${at === count - 1 ? `V${end - 18}a18 18 0 0 0 18 18H74` : tail}`,
    filledTo: y - 38 - 58 + 2 * QUARTER + 14,
    length: straight,
  };
}

/** The run on wide windows: a rail at the left, each finished step with its answer under it, as a link back. */
export function RunRail({ steps }: { readonly steps: readonly RunStep[] }) {
  const at = steps.findIndex((step) => step.state === 'now');
  const complete = at < 0 && steps.length > 0 && steps.every((step) => step.state === 'done');
  const { d, filledTo, length } = pipe(steps.length, at);
  const height = TOP + steps.length * ROW + 20;
  return (
    <View role="navigation" aria-label="Progress" style={{ width: 236, height }}>
      <Svg width={136} height={height} aria-hidden style={StyleSheet.absoluteFill}>
        <Conduit d={d} width={12} filledTo={complete ? undefined : filledTo} length={length} empty />
        <G transform="translate(0 0) scale(1.55)"><RunPanel x={0} y={0} /></G>
        <G transform={`translate(72 ${TOP + (steps.length - 1) * ROW + 34}) scale(1.25)`}><RunCar x={0} y={0} done={complete} /></G>
        {steps.map((step, index) => (
          <RunBox key={step.id} x={index === at ? LINE + JOG : LINE} y={TOP + index * ROW} state={step.state} mark={String(index + 1)} />
        ))}
      </Svg>
      <View role="list" style={{ paddingTop: TOP - 22 }}>
        {steps.map((step, index) => (
          <View key={step.id} role="listitem" aria-current={step.state === 'now' ? 'step' : undefined} style={[styles.row, index === at && styles.now]}>
            {step.href && step.state === 'done' ? (
              <Anchor href={step.href} style={() => styles.link}>
                <Text style={styles.unseen}>{`Step ${index + 1}, done: `}</Text>
                <Words step={step} />
              </Anchor>
            ) : (
              <View style={styles.link}><Words step={step} /></View>
            )}
          </View>
        ))}
      </View>
    </View>
  );
}

function Words({ step }: { step: RunStep }) {
  return (
    <>
      <Text variant="subheading" weight={step.state === 'todo' ? 700 : 800} color={step.state === 'todo' ? 'ink2' : 'ink'}>{step.label}</Text>
      {step.summary && step.state === 'done' ? <Text variant="note" weight={500} color="ink2" numberOfLines={2}>{step.summary}</Text> : null}
    </>
  );
}

const styles = StyleSheet.create({
  row: { height: ROW, paddingLeft: 50 },
  now: { paddingLeft: 74 },
  unseen: { position: 'absolute', width: 1, height: 1, overflow: 'hidden', opacity: 0 },
  link: { minHeight: 44, justifyContent: 'center', alignSelf: 'flex-start' },
});
