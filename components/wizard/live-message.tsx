import { StyleSheet, View } from 'react-native';
import { Text } from '../ui/text';

/** A polite message for screen readers alone; it is read when its words change. */
export function LiveMessage({ words }: { words: string }) {
  return (
    <View role="status" aria-live="polite" style={styles.hidden}>
      <Text>{words}</Text>
    </View>
  );
}

const styles = StyleSheet.create({ hidden: { position: 'absolute', width: 1, height: 1, overflow: 'hidden', opacity: 0 } });
