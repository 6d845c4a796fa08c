import CloudOff from 'lucide-react-native/icons/cloud-off';
import { useState } from 'react';
import { Toast } from '../ui/toast';
import { useWizard } from './wizard-context';

/** Says when answers have not reached us: they stay on the page, and are sent again by themselves, or at once if asked to. */
export function SaveToast() {
  const { save, flush } = useWizard();
  const [closed, setClosed] = useState(false);
  if (save === 'saved' && closed) setClosed(false);
  return (
    <Toast
      message={save === 'failed' && !closed ? 'No connection. Your answers are kept on this page.' : null}
      icon={CloudOff}
      onClose={() => setClosed(true)}
      action={{ label: 'Try now', onPress: () => void flush() }}
    />
  );
}
