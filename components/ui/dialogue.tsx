import type { ReactNode } from 'react';
import { Modal, View } from 'react-native';
import { colors, radius, space } from '../theme/tokens';
import { DialogueBody } from './dialogue-body';

export interface DialogueProps {
  readonly open: boolean;
  /** A question. */
  readonly title: string;
  /** What follows from it, in numbers; or a short form. */
  readonly children: ReactNode;
  /** Also what Escape does. */
  readonly onClose: () => void;
  /** The safe choice, left; it has the focus first. */
  readonly safeLabel: string;
  /** The doing choice, right: a verb on it. */
  readonly act?: { readonly label: string; readonly onPress: () => void; readonly busy?: boolean; readonly busyLabel?: string; readonly kind?: 'filled' | 'stop' };
}

/** Only for what spends money, sends something or changes prices, and for "Finish later". */
export function Dialogue(props: DialogueProps) {
  return (
    <Modal visible={props.open} transparent onRequestClose={props.onClose}>
      <View role="dialog" aria-modal aria-label={props.title} style={{ margin: space[4], marginTop: 'auto', backgroundColor: colors.card, borderRadius: radius.sheet, padding: space[6] }}>
        <DialogueBody {...props} />
      </View>
    </Modal>
  );
}
