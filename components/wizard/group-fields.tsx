import { View } from 'react-native';
import { visibleFields, type Group } from '../../shared/wizard/index';
import { space } from '../theme/tokens';
import { FieldInput } from './fields/field-input';
import type { StepState } from './use-step';
import { useWizard } from './wizard-context';

interface Props {
  readonly group: Group;
  readonly state: StepState;
  /** Lists that fold away instead of cards: beside a plan there is little room. */
  readonly compact?: boolean;
}

/** The questions of one group that apply, in order. A lone choice needs no label: the title above asks it. */
export function GroupFields({ group, state, compact = false }: Props) {
  const { answers } = useWizard();
  const fields = visibleFields(group, answers);
  if (fields.length === 0) return null;
  return (
    <View style={{ gap: compact ? space[4] : space[6] }}>
      {fields.map((field) => (
        <FieldInput
          key={field.id}
          field={field}
          compact={compact || group.drawing === 'plan'}
          titled={fields.length === 1 && field.kind !== 'text' && field.kind !== 'number'}
          error={state.errorOf(field.id)}
          onLeave={state.leaveField}
          onSubmit={state.goOn}
        />
      ))}
    </View>
  );
}
