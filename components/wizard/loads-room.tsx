import { Card } from '../ui/card';
import { LoadGauge } from '../ui/load-gauge';
import { Text } from '../ui/text';
import { useWizard } from './wizard-context';

/** Whether the charger fits beside what the home takes; while that cannot be told, what is missing. */
export function LoadsRoom() {
  const { intake, answers } = useWizard();
  const load = intake?.range.load;
  if (!load) {
    return (
      <Card>
        <Text variant="subheading" level={2}>Room on your panel</Text>
        <Text variant="note" color="ink2">
          {typeof answers.mainBreakerAmps === 'string' ? 'Turn on what you have. Then we show how much room is left for a charger.' : 'We show this once we know the main breaker.'}
        </Text>
      </Card>
    );
  }
  return <Card><LoadGauge {...load} /></Card>;
}
