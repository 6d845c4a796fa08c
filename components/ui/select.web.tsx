import ChevronDown from 'lucide-react-native/icons/chevron-down';
import { describedBy, FieldError, Hint } from './field-notes';
import { Glyph } from './glyph';
import { Label } from './label';
import type { SelectProps } from './select';

/** One of a longer list: the browser's own select, in our clothes. */
export function Select({ id, label, hideLabel = false, hint, choices, value, onChange, onBlur, placeholder = 'Pick one', error, size = 'normal' }: SelectProps) {
  return (
    <div className="ui-group">
      {hideLabel ? null : <Label id={id} label={label} />}
      {hint ? <Hint id={id}>{hint}</Hint> : null}
      <div className="ui-select-frame">
        <select
          id={id} className={`ui-select${size === 'desk' ? ' ui-select-desk' : ''}${error ? ' ui-wrong' : ''}`} value={value ?? ''} aria-label={hideLabel ? label : undefined}
          aria-invalid={error ? true : undefined} aria-describedby={describedBy(id, hint, error)}
          onBlur={onBlur} onChange={(event) => onChange(event.currentTarget.value)}
        >
          {value === null ? <option value="" disabled>{placeholder}</option> : null}
          {choices.map((choice) => <option key={choice.value} value={choice.value}>{choice.label}</option>)}
        </select>
        <span className="ui-select-mark" aria-hidden="true"><Glyph of={ChevronDown} /></span>
      </div>
      {error ? <FieldError id={id}>{error}</FieldError> : null}
    </div>
  );
}
