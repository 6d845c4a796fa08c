import Mail from 'lucide-react-native/icons/mail';
import { FinishLater } from '../wizard/finish-later';

/** Mails a link to this price. */
export const SendToMe = () => <FinishLater label="Send to me" icon={Mail} />;
