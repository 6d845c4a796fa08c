import Mail from 'lucide-react-native/icons/mail';
import { useState } from 'react';
import { FinishLater } from '../wizard/finish-later';
import { TextButton } from '../ui/text-button';

/** Mails a link to this price. */
export function SendToMe() {
  const [open, setOpen] = useState(false);
  return (
    <>
      <TextButton label="Send to me" icon={Mail} onPress={() => setOpen(true)} />
      {open ? <FinishLater onClose={() => setOpen(false)} /> : null}
    </>
  );
}
