import { StyleSheet, View } from 'react-native';
import type { PlanDrawing, QuoteOption } from '../../shared/quote';
import { feetInWords } from '../../shared/units';
import { space } from '../theme/tokens';
import { GaragePlan } from '../plan/garage-plan';
import { Card } from '../ui/card';
import { Directory } from '../ui/directory';
import { Link } from '../ui/link';
import { Text } from '../ui/text';

const whole = (lengthFt: number) => feetInWords(Math.round(lengthFt));

/** The run of the chosen option: drawn where there is a garage, in words everywhere. */
export function RunCard({ plan, option }: { readonly plan: PlanDrawing | null; readonly option: QuoteOption }) {
  const { run, circuit } = option;
  return (
    <Card style={{ gap: space[3] }}>
      <View style={styles.head}>
        <Text variant="subheading" level={2}>{`Your run, ${whole(run.lengthFt)}`}</Text>
        <Link label="Change" href="/quote/garage" variant="note" spokenLabel="Change the run" />
      </View>
      {plan ? <GaragePlan plan={plan} maxHeightPx={340} /> : null}
      <Directory
        label="The run"
        items={[
          { key: 'walls', title: run.methodWords, value: whole(run.wallFt) },
          { key: 'up', title: 'Up and down', value: whole(run.upDownFt) },
          { key: 'whole', title: 'Whole run', note: circuit.words, value: whole(run.lengthFt) },
        ]}
      />
    </Card>
  );
}

const styles = StyleSheet.create({ head: { flexDirection: 'row', justifyContent: 'space-between', alignItems: 'center', gap: space[3] } });
