import { ChoiceInput } from './choice-input';
import type { FieldInputProps } from './field-props';
import { LoadsInput } from './loads-input';
import { ManyInput } from './many-input';
import { NumberInput } from './number-input';
import { TextInput } from './text-input';

/** One question of the wizard, as its declaration says. */
export function FieldInput({ field, ...rest }: FieldInputProps) {
  switch (field.kind) {
    case 'choice': return <ChoiceInput field={field} {...rest} />;
    case 'many': return <ManyInput field={field} {...rest} />;
    case 'number': return <NumberInput field={field} {...rest} />;
    case 'text': return <TextInput field={field} {...rest} />;
    case 'loads': return <LoadsInput label={field.label} />;
  }
}
