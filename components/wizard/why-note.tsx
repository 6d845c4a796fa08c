import { Text } from '../ui/text';
import { CautionBox } from '../ui/caution-box';

/** Why the question matters for the price. */
export function WhyNote({ words }: { words: string }) {
  return <CautionBox level="note"><Text><Text weight={800}>Why we ask: </Text>{words.charAt(0).toLowerCase() + words.slice(1)}</Text></CautionBox>;
}
