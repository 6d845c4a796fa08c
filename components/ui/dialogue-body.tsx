import { View } from 'react-native';
import { space } from '../theme/tokens';
import { Button } from './button';
import type { DialogueProps } from './dialogue';
import { Text } from './text';

/** Title, words and the two choices. */
export function DialogueBody({ title, children, onClose, safeLabel, act }: DialogueProps) {
  return (
    <View style={{ gap: space[3] }}>
      <Text variant="heading" level={2} nativeID="dialogue-title">{title}</Text>
      {typeof children === 'string' ? <Text color="ink2">{children}</Text> : children}
      <View style={{ flexDirection: 'row', flexWrap: 'wrap', justifyContent: 'flex-end', gap: space[2], paddingTop: space[2] }}>
        <Button kind="quiet" size="desk" label={safeLabel} onPress={onClose} />
        {act ? (
          <Button kind={act.kind ?? 'filled'} size="desk" label={act.label} onPress={act.onPress} busy={act.busy ?? false} busyLabel={act.busyLabel ?? 'Sending'} />
        ) : null}
      </View>
    </View>
  );
}
