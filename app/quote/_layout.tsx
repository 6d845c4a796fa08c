import { Slot } from 'expo-router';
import { WizardProvider } from '../../components/wizard/wizard-provider';

export default function QuoteLayout() {
  return (
    <WizardProvider>
      <Slot />
    </WizardProvider>
  );
}
