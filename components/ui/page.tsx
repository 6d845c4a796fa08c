import Head from 'expo-router/head';
import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { useCompany } from '../api/use-company';
import { colors, space } from '../theme/tokens';
import { PageHeader } from './page-header';
import { SkipLink } from './skip-link';
import { useFocusHeading } from './use-focus-heading';

export interface PageProps {
  /** The window's title, before the company's name. */
  readonly title: string;
  /** Another key moves the focus to the h1 again: give the step and its part. The title by default. */
  readonly focusKey?: string;
  /** At the right of the header. */
  readonly header?: ReactNode;
  readonly hidePhone?: boolean;
  /** Under the header: the run on phones. */
  readonly run?: ReactNode;
  /** Stays at the bottom of the window on phones and tablets. */
  readonly dock?: ReactNode;
  /** Under the page's matter, outside of its landmark. */
  readonly footer?: ReactNode;
  /** text: at most 760 px, for reading. normal: the page's grid. full: edge to edge. */
  readonly width?: 'text' | 'normal' | 'full';
  /** Holds exactly one heading of level 1. */
  readonly children: ReactNode;
}

/** Every public page: header, main landmark, skip link, window title, focus on the heading after a move. */
export function Page({ title, focusKey, header, hidePhone = false, run, dock, footer, width = 'normal', children }: PageProps) {
  const company = useCompany().data;
  useFocusHeading(focusKey ?? title);
  return (
    <View dataSet={{ part: 'page' }} style={styles.page}>
      <Head>
        <title>{company ? `${title} – ${company.name}` : title}</title>
      </Head>
      <SkipLink />
      <PageHeader hidePhone={hidePhone} ruled={width !== 'full' && !run}>{header}</PageHeader>
      {run}
      <View role="main" id="main" dataSet={{ part: 'main', width }} style={[styles.main, width !== 'full' && styles.inset]}>{children}</View>
      {footer}
      {dock}
    </View>
  );
}

const styles = StyleSheet.create({
  page: { flexGrow: 1, backgroundColor: colors.paper },
  main: { flexGrow: 1, width: '100%', alignSelf: 'center' },
  inset: { paddingHorizontal: space[4], paddingTop: space[5], paddingBottom: space[7] },
});
