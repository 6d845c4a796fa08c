import { StyleSheet, View } from 'react-native';
import Svg from 'react-native-svg';
import { Conduit } from '../drawings/conduit';
import { RunBox, RunCar, RunPanel } from '../drawings/run-parts';
import { border, colors, space } from '../theme/tokens';
import { useMedia } from '../theme/use-media';
import { Anchor } from './anchor';
import { spokenStep, type RunStep } from './run-steps';
import { Text } from './text';

const WIDTH = 358;
const HEIGHT = 54;
const LOW = 40;
const HIGH = 14;
/** Where each of the seven boxes stands, and how far along the pipe that is (straight parts and quarter circles of radius 13). */
const BOXES = [
  { x: 54, y: LOW, at: 18 }, { x: 88, y: LOW, at: 52 }, { x: 132, y: HIGH, at: 110.8 }, { x: 176, y: HIGH, at: 154.8 },
  { x: 220, y: HIGH, at: 198.8 }, { x: 262, y: LOW, at: 255.7 }, { x: 294, y: LOW, at: 287.7 },
] as const;
const PIPE = 'M36 40H98a13 13 0 0 0 13-13a13 13 0 0 1 13-13H232a13 13 0 0 1 13 13a13 13 0 0 0 13 13H318';
const PIPE_LENGTH = 311.7;

/** The run on phones and tablets: a strip with the words under it. In a low window only the words. */
export function RunStrip({ steps, next }: { readonly steps: readonly RunStep[]; /** "Next: Big loads" */ readonly next?: string }) {
  const low = useMedia('(max-height: 479px)');
  const at = steps.findIndex((step) => step.state === 'now');
  const current = steps[at];
  const complete = at < 0 && steps.every((step) => step.state === 'done');
  const filledTo = complete ? PIPE_LENGTH : (BOXES[Math.max(at, 0)]?.at ?? 0);
  return (
    <View role="navigation" aria-label="Progress" style={styles.strip}>
      {low ? null : (
        <View style={styles.drawing}>
          <Svg width="100%" height="100%" viewBox={`0 0 ${WIDTH} ${HEIGHT}`} aria-hidden>
            <Conduit d={PIPE} width={9} length={PIPE_LENGTH} filledTo={filledTo} empty />
            <RunPanel x={6} y={14} />
            <RunCar x={314} y={21} done={complete} />
            {steps.slice(0, BOXES.length).map((step, index) => {
              const box = BOXES[index];
              return box ? <RunBox key={step.id} x={box.x} y={box.y} state={step.state} mark={String(index + 1)} /> : null;
            })}
          </Svg>
          <View role="list" style={StyleSheet.absoluteFill}>
            {steps.slice(0, BOXES.length).map((step, index) => <Stop key={step.id} step={step} index={index} />)}
          </View>
        </View>
      )}
      <View style={styles.words}>
        <Text variant="note" weight={800}>{current ? `Step ${at + 1} of ${steps.length} · ${current.label}` : ' '}</Text>
        {next ? <Text variant="note" weight={700} color="ink2">{next}</Text> : null}
      </View>
    </View>
  );
}

/** What can be pressed over a box of the drawing: finished steps lead back. */
function Stop({ step, index }: { step: RunStep; index: number }) {
  const box = BOXES[index];
  if (!box) return null;
  const spoken = spokenStep(step, index);
  return (
    <View role="listitem" aria-current={step.state === 'now' ? 'step' : undefined} style={[styles.stop, { left: `${((box.x - 16) / WIDTH) * 100}%` }]}>
      {step.href && step.state === 'done' ? (
        <Anchor href={step.href} spokenLabel={spoken} style={() => styles.target}>{null}</Anchor>
      ) : (
        <Text style={styles.unseen}>{spoken}</Text>
      )}
    </View>
  );
}

const styles = StyleSheet.create({
  strip: { width: '100%', alignSelf: 'center', paddingHorizontal: space[4], paddingBottom: space[2], borderBottomWidth: border.hair, borderColor: colors.rule },
  drawing: { width: '100%', maxWidth: 440, aspectRatio: WIDTH / HEIGHT, alignSelf: 'center' },
  words: { flexDirection: 'row', flexWrap: 'wrap', justifyContent: 'space-between', columnGap: space[3], paddingTop: space[1], width: '100%', maxWidth: 680, alignSelf: 'center' },
  stop: { position: 'absolute', top: 0, bottom: 0, width: `${(32 / WIDTH) * 100}%` },
  target: { flexGrow: 1, minHeight: 44 },
  unseen: { position: 'absolute', width: 1, height: 1, overflow: 'hidden', opacity: 0 },
});
