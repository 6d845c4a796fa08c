import { View } from 'react-native';
import { colors, radius } from '../theme/tokens';
import { Text } from './text';

/** The numbered box of a directory line or a photo. */
export function NumberBox({ n, dark = false }: { readonly n: number | string; readonly dark?: boolean }) {
  return (
    <View style={{ minWidth: 26, height: 22, paddingHorizontal: 5, borderRadius: radius.plate, borderWidth: 1.5, borderColor: dark ? colors.spruce : colors.ink3, backgroundColor: dark ? colors.spruce : 'transparent', alignItems: 'center', justifyContent: 'center' }}>
      <Text variant="fine" weight={700} color={dark ? 'paper' : 'ink2'}>{String(n)}</Text>
    </View>
  );
}
