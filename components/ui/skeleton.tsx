import { useEffect, useState, type ReactNode } from 'react';
import { View, type DimensionValue } from 'react-native';
import { colors, radius, space } from '../theme/tokens';
import { Text } from './text';

/** One bar of a skeleton, in the shape of what comes. */
export function Bar({ width = '100%', height = 20 }: { readonly width?: DimensionValue; readonly height?: number }) {
  return <View dataSet={{ bar: 'yes' }} style={{ width, height, borderRadius: radius.tag, backgroundColor: colors.well }} />;
}

export interface SkeletonProps {
  /** Spoken once: "Loading leads". */
  readonly label: string;
  /** Rows of the ordinary shape; or give bars as children. */
  readonly lines?: number;
  readonly children?: ReactNode;
}

const WAIT_MS = 300;

/** Stands in for what is loading, after 300 ms: what is quick shows no skeleton. */
export function Skeleton({ label, lines = 4, children }: SkeletonProps) {
  const [shown, setShown] = useState(false);
  useEffect(() => {
    const timer = setTimeout(() => setShown(true), WAIT_MS);
    return () => clearTimeout(timer);
  }, []);
  return (
    <View aria-busy role="status" aria-label={label} style={{ gap: space[4], opacity: shown ? 1 : 0 }}>
      <View dataSet={{ unseen: 'yes' }} style={{ position: 'absolute', width: 1, height: 1, overflow: 'hidden' }}><Text>{label}</Text></View>
      {children ?? Array.from({ length: lines }, (_, index) => <Bar key={index} width={`${[92, 70, 84, 60][index % 4] ?? 80}%`} />)}
    </View>
  );
}
