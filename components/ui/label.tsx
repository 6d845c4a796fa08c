import { Text } from './text';

/** The words above a control; on the web a real label, so that pressing it reaches the control. */
export function Label({ id, label, optional = false }: { readonly id: string; readonly label: string; readonly optional?: boolean }) {
  return (
    <Text variant="note" weight={800} nativeID={`${id}-label`} style={{ fontSize: 15 }}>
      {label}{optional ? <Text variant="note" color="ink2"> (if you like)</Text> : null}
    </Text>
  );
}
