import { useState } from 'react';
import { View } from 'react-native';
import { cautions } from '../../shared/wizard/index';
import { useCompany } from '../api/use-company';
import { space } from '../theme/tokens';
import { ButtonLink } from '../ui/button-link';
import { CautionBox } from '../ui/caution-box';
import { Link } from '../ui/link';
import { Text } from '../ui/text';
import { useWizard } from './wizard-context';

const DANGERS = ['rust_or_water', 'warm', 'buzzing', 'scorch'];

/** True when what was seen or heard at the panel is a reason to leave it alone. */
export const isDanger = (condition: unknown): boolean =>
  Array.isArray(condition) && condition.some((entry) => DANGERS.includes(String(entry)));

/** The stop box that appears when a danger is picked: whom to call, and a way out. The person may still go on. */
export function DangerStop() {
  const { answers, intake } = useWizard();
  const phone = useCompany().data?.phone;
  const danger = isDanger(answers.panelCondition);
  // Only what appears after an answer takes the focus, not what was there when the answers came.
  const [calm, setCalm] = useState(false);
  if (intake && !danger && !calm) setCalm(true);
  if (!danger) return null;
  return (
    <CautionBox
      level="stop" title="Leave the panel alone" focusOnMount={calm}
      action={(
        <View style={{ flexDirection: 'row', flexWrap: 'wrap', columnGap: space[5], rowGap: space[2], alignItems: 'center', paddingTop: space[2] }}>
          {phone ? <Link label={`Call ${phone}`} href={`tel:${phone}`} color="stop" /> : null}
          <ButtonLink label="I’ll stop here" kind="quiet" href="/quote/visit" />
        </View>
      )}
    >
      <View style={{ gap: space[1] }}>
        <Text weight={600}>{cautions.danger.words.replace('{phone}', phone ?? 'us')}</Text>
        <Text weight={600}>{cautions.emergency.words}</Text>
        <Text color="ink2">You can go on with the other questions from where you sit. An electrician looks at the panel first.</Text>
      </View>
    </CautionBox>
  );
}
