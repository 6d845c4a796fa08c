import { CautionBox } from '../ui/caution-box';

/** Why the question matters for the price. */
export const WhyNote = ({ words }: { words: string }) => <CautionBox level="note" title="Why we ask">{words}</CautionBox>;
