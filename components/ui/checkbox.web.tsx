import type { CheckboxProps } from './checkbox';
import { CheckMark } from './check-mark';
import { describedBy, FieldError } from './field-notes';
import { Text } from './text';

/** One thing to tick: a real checkbox inside of its label. */
export function Checkbox({ id, label, note, checked, onChange, error }: CheckboxProps) {
  return (
    <div className="ui-group">
      <label className="ui-choice ui-tick">
        <input
          type="checkbox" id={id} className="ui-input" checked={checked} aria-invalid={error ? true : undefined}
          aria-describedby={describedBy(id, undefined, error)} onChange={(event) => onChange(event.currentTarget.checked)}
        />
        <CheckMark checked={checked} wrong={Boolean(error)} />
        <span className="ui-tick-words">
          {label}
          {note ? <Text variant="note" weight={500} color="ink2">{note}</Text> : null}
        </span>
      </label>
      {error ? <FieldError id={id}>{error}</FieldError> : null}
    </div>
  );
}
