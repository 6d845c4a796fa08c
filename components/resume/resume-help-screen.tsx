import { View } from 'react-native';
import { useCompany } from '../api/use-company';
import { space } from '../theme/tokens';
import { ButtonLink } from '../ui/button-link';
import { Directory } from '../ui/directory';
import { Link } from '../ui/link';
import { Page } from '../ui/page';
import { Text } from '../ui/text';

/** How a saved job is opened: by the link in the mail, or in the browser where it was begun. */
export function ResumeHelpScreen() {
  const phone = useCompany().data?.phone;
  return (
    <Page title="Open a saved job" width="text">
      <View style={{ gap: space[5], alignItems: 'flex-start' }}>
        <Text variant="title" level={1}>Open a saved job</Text>
        <View style={{ width: '100%' }}>
          <Directory
            label="Ways to open it"
            items={[
              { key: 'mail', title: 'On any device', note: 'Open the link in the mail you asked for with “Finish later”.' },
              { key: 'here', title: 'In this browser', note: 'If you began here, your answers are still here.' },
              { key: 'call', title: 'No mail, no answers', note: `Start again.${phone ? ` Or call ${phone}.` : ''}` },
            ]}
          />
        </View>
        <ButtonLink label="Go on in this browser" href="/quote" />
        {phone ? <Link label={`Call ${phone}`} href={`tel:${phone}`} /> : null}
      </View>
    </Page>
  );
}
