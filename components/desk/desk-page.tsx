import Head from 'expo-router/head';
import type { ReactNode } from 'react';
import { View } from 'react-native';
import { space } from '../theme/tokens';
import { useBreakpoint } from '../theme/use-breakpoint';
import { useFocusHeading } from '../ui/use-focus-heading';

export interface DeskPageProps {
  /** The window's title; another one moves the focus to the h1. */
  readonly title: string;
  /** Holds exactly one heading of level 1. */
  readonly children: ReactNode;
}

/** One page of the desk beside the rail: window title, focus on the heading, margins. */
export function DeskPage({ title, children }: DeskPageProps) {
  const phone = useBreakpoint() === 'phone';
  useFocusHeading(title);
  return (
    <View style={{ padding: phone ? space[4] : 28, paddingTop: phone ? space[4] : space[5], gap: space[4], width: '100%', maxWidth: 1560 }}>
      <Head><title>{`${title} – Tidyrun desk`}</title></Head>
      {children}
    </View>
  );
}
