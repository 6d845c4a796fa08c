import type { ReactNode } from 'react';
import { shortLabels, type ChoiceGroupProps } from './choice-options';
import { describedBy, FieldError, Hint } from './field-notes';
import { Text } from './text';

interface Props extends ChoiceGroupProps {
  readonly role?: 'radiogroup' | 'group';
  /** Under the group once "Not sure" is picked. */
  readonly remark: string | null;
  readonly children: ReactNode;
}

/** The frame around a group of radios or checkboxes: label, hint, cards in a grid, remark, error. */
export function ChoiceGroup({ id, label, hideLabel = false, hint, choices, error, columns = 1, role = 'group', remark, onBlur, children }: Props) {
  const width = columns === 1 ? 'one' : columns === 2 ? (shortLabels(choices) ? 'two-short' : 'two') : shortLabels(choices, 12) ? 'three' : 'three-long';
  return (
    <div
      id={id}
      role={role}
      aria-labelledby={`${id}-label`}
      aria-describedby={describedBy(id, hint, error)}
      aria-invalid={role === 'radiogroup' && error ? true : undefined}
      className="ui-group"
      onBlur={(event) => { if (!event.currentTarget.contains(event.relatedTarget)) onBlur?.(); }}
    >
      <span id={`${id}-label`} className={hideLabel ? 'ui-unseen' : 'ui-label'}>{label}</span>
      {hint ? <Hint id={id}>{hint}</Hint> : null}
      <div className={`ui-grid ui-grid-${width}`}>{children}</div>
      {remark ? <Text variant="note" color="ink2" role="status">{remark}</Text> : null}
      {error ? <FieldError id={id}>{error}</FieldError> : null}
    </div>
  );
}
