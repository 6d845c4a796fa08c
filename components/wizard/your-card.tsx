import { View } from 'react-native';
import { steps, visibleFields, visibleGroups, type Answers } from '../../shared/wizard/index';
import { space } from '../theme/tokens';
import { Card } from '../ui/card';
import { Directory, type DirectoryItem } from '../ui/directory';
import { Plate } from '../ui/plate';
import { Text } from '../ui/text';
import { useWizard } from './wizard-context';

/** How many lines the card holds: the latest answers, as on the small card inside of a panel's door. */
const LINES = 5;

/** The latest answers, each a link to where it was given. */
export function YourCard() {
  const { answers, intake } = useWizard();
  const lines = answeredLines(answers, intake?.town ?? null);
  if (lines.length === 0) return null;
  const shown = lines.slice(-LINES);
  return (
    <Card>
      <View style={{ flexDirection: 'row', justifyContent: 'space-between', alignItems: 'center', paddingBottom: space[1] }}>
        <Plate>Your card</Plate>
        <Text variant="note" color="ink2">edit any line</Text>
      </View>
      <Directory label="Your latest answers" items={shown} start={lines.length - shown.length + 1} />
    </Card>
  );
}

/** Every answer in words, in the wizard's order, with a link to its group. The board of loads counts as one line. */
export function answeredLines(answers: Answers, town: string | null): readonly DirectoryItem[] {
  return steps.flatMap((step) => visibleGroups(step, answers).flatMap((group) => visibleFields(group, answers)
    .filter((field) => answers[field.id] !== undefined)
    .map((field): DirectoryItem => {
      const words = field.id === 'zip' && town ? town : field.kind === 'loads' ? step.summary(answers) : field.words(answers[field.id]);
      const title = field.id === 'zip' && town ? 'Town' : field.name;
      return { key: field.id, title, value: words, href: `/quote/${step.id}?part=${group.id}` };
    })));
}
