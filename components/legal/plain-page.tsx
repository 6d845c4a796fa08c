import { View } from 'react-native';
import { space } from '../theme/tokens';
import { Link } from '../ui/link';
import { Page } from '../ui/page';
import { Text } from '../ui/text';

export interface PlainPageProps {
  readonly title: string;
  readonly sections: readonly { readonly heading: string; readonly paragraphs: readonly string[] }[];
}

/** A page to read: headings and short paragraphs, nothing else. */
export function PlainPage({ title, sections }: PlainPageProps) {
  return (
    <Page title={title} width="text">
      <View style={{ gap: space[5] }}>
        <Text variant="title" level={1}>{title}</Text>
        {sections.map((section) => (
          <View key={section.heading} style={{ gap: space[2] }}>
            <Text variant="heading" level={2}>{section.heading}</Text>
            {section.paragraphs.map((paragraph) => <Text key={paragraph}>{paragraph}</Text>)}
          </View>
        ))}
        <Link label="Back to the start" href="/" />
      </View>
    </Page>
  );
}
