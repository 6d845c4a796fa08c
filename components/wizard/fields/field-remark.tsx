import type { Field } from '../../../shared/wizard/index';
import { CautionBox } from '../../ui/caution-box';
import { useWizard } from '../wizard-context';

/** A calm word on an answer that is allowed but worth one. */
export function FieldRemark({ field }: { field: Field }) {
  const { answers } = useWizard();
  const words = field.remark?.(answers);
  return words ? <CautionBox level="note">{words}</CautionBox> : null;
}
