import { useEffect, useRef } from 'react';
import type { DialogueProps } from './dialogue';
import { DialogueBody } from './dialogue-body';

/**
 * The browser's own modal dialog: it keeps the focus inside, gives it back afterwards, and Escape is the safe choice.
 * A sheet on phones.
 */
export function Dialogue(props: DialogueProps) {
  const { open, onClose } = props;
  const dialog = useRef<HTMLDialogElement>(null);
  useEffect(() => {
    const element = dialog.current;
    if (!element || element.open === open) return;
    if (open) element.showModal();
    else element.close();
  }, [open]);
  return (
    <dialog
      ref={dialog}
      className="ui-dialogue"
      aria-labelledby="dialogue-title"
      onCancel={(event) => { event.preventDefault(); onClose(); }}
      onClick={(event) => { if (event.target === dialog.current) onClose(); }}
    >
      {open ? <div className="ui-dialogue-body"><DialogueBody {...props} /></div> : null}
    </dialog>
  );
}
