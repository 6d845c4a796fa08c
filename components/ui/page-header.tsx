import Phone from 'lucide-react-native/icons/phone';
import { Link } from 'expo-router';
import type { ReactNode } from 'react';
import { Pressable, StyleSheet, View } from 'react-native';
import { useCompany } from '../api/use-company';
import { BrandMark } from '../drawings/brand-mark';
import { border, colors, space, targetPx } from '../theme/tokens';
import { Link as TextLink } from './link';
import { Text } from './text';

interface PageHeaderProps {
  /** At the right, after the phone. */
  readonly children?: ReactNode;
  readonly hidePhone?: boolean;
  /** A hairline under it. */
  readonly ruled?: boolean;
}

/** Mark, the contractor's name, its phone and whatever a page adds at the right. */
export function PageHeader({ children, hidePhone = false, ruled = false }: PageHeaderProps) {
  const company = useCompany().data;
  return (
    <View role="banner" dataSet={{ part: 'header' }} style={[styles.header, ruled && styles.ruled]}>
      <Link href="/" asChild>
        <Pressable role="link" aria-label={company ? `${company.name}, start page` : 'Start page'} style={styles.brand}>
          <BrandMark size={36} />
          <Text variant="subheading" numberOfLines={2} style={styles.name}>{company?.name ?? ' '}</Text>
        </Pressable>
      </Link>
      <View style={styles.side}>
        {hidePhone ? null : (
          <View style={styles.phone}>
            {company ? <TextLink href={`tel:${company.phone}`} icon={Phone} label={company.phone} spokenLabel={`Call ${company.phone}`} /> : null}
          </View>
        )}
        {children}
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  header: { flexDirection: 'row', alignItems: 'center', justifyContent: 'space-between', gap: space[3], minHeight: 56, paddingHorizontal: space[4], width: '100%', maxWidth: 1440, alignSelf: 'center' },
  ruled: { borderBottomWidth: border.hair, borderColor: colors.rule },
  brand: { flexDirection: 'row', alignItems: 'center', gap: space[2], minHeight: targetPx, flexShrink: 1, minWidth: 0 },
  name: { flexShrink: 1, lineHeight: 21 },
  // Its room is kept while the number is on its way, so that nothing beside it moves.
  phone: { minWidth: 124, minHeight: targetPx, flexDirection: 'row', justifyContent: 'flex-end' },
  side: { flexDirection: 'row', alignItems: 'center', gap: space[6], flexShrink: 0 },
});
