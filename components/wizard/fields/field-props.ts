import type { Field } from '../../../shared/wizard/index';

export interface FieldInputProps<F extends Field = Field> {
  readonly field: F;
  readonly error: string | null;
  /** The screen's title asks this already: the label is only spoken. */
  readonly titled: boolean;
  /** A list that folds away instead of cards. */
  readonly compact: boolean;
  /** The person has left the field. */
  readonly onLeave: (id: string) => void;
  /** Enter in a text box. */
  readonly onSubmit: () => void;
}
