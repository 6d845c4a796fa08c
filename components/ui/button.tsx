import { useRef } from 'react';
import { Pressable, View } from 'react-native';
import { space } from '../theme/tokens';
import { ButtonFace, buttonStyle, type ButtonFaceProps } from './button-face';
import { Text } from './text';

export interface ButtonProps extends ButtonFaceProps {
  /** A verb and its object, sentence case, no period. The spoken name of a square button. */
  readonly label: string;
  readonly onPress: () => void;
  /** Keeps its place and focus, says so, ignores presses. */
  readonly busy?: boolean;
  /** Rare: prefer a button that leads to the error summary. */
  readonly off?: boolean;
  /** Why it is off; stands under it. */
  readonly offReason?: string;
  /** Takes the room left in its row. */
  readonly grow?: boolean;
  /** When the label alone is not enough for someone who only hears it. */
  readonly spokenLabel?: string;
}

/** A real button, 52 px high (44 at the desk). One filled one a region. */
export function Button({ onPress, busy = false, off = false, offReason, grow = false, spokenLabel, ...face }: ButtonProps) {
  const lastPress = useRef(0);
  const press = () => {
    const now = Date.now();
    // A double tap is one wish.
    if (busy || off || now - lastPress.current < 400) return;
    lastPress.current = now;
    onPress();
  };
  const button = (
    <Pressable
      role="button"
      aria-label={busy ? (face.busyLabel ?? 'Saving') : (spokenLabel ?? face.label)}
      aria-busy={busy}
      aria-disabled={off || busy}
      onPress={press}
      style={({ pressed }) => buttonStyle(face.kind ?? 'filled', face.size ?? 'normal', { pressed: pressed && !off, off, grow: grow && !offReason })}
    >
      <ButtonFace {...face} busy={busy} off={off} />
    </Pressable>
  );
  if (!offReason) return button;
  return (
    <View style={[{ gap: space[1] }, grow && { flexGrow: 1 }]}>
      {button}
      {off ? <Text variant="note" color="ink2">{offReason}</Text> : null}
    </View>
  );
}
