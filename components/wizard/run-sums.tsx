import { feetInWords } from '../../shared/units';
import { Card } from '../ui/card';
import { Directory } from '../ui/directory';
import { useWizard } from './wizard-context';

/** What the run adds up to: along the walls, up and down, all of it. */
export function RunSums() {
  const run = useWizard().intake?.range.plan?.run;
  if (!run) return null;
  const whole = (lengthFt: number) => feetInWords(Math.round(lengthFt));
  return (
    <Card>
      <Directory
        label="Length of the run"
        items={[
          { key: 'wall', title: 'Along the walls', value: whole(run.wallFt) },
          { key: 'up', title: 'Up and down', value: whole(run.upDownFt) },
          { key: 'all', title: 'Whole run', value: whole(run.lengthFt) },
        ]}
      />
    </Card>
  );
}
