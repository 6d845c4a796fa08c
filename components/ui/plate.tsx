import { View } from 'react-native';
import { colors, radius, space } from '../theme/tokens';
import { Text } from './text';

interface PlateProps {
  readonly children: string;
  readonly number?: number;
  readonly dark?: boolean;
}

/** An engraved plate: at most three words in capitals, with the step's number if it has one. `dark`: on spruce. */
export function Plate({ children, number, dark = false }: PlateProps) {
  return (
    <View style={{ flexDirection: 'row', alignSelf: 'flex-start', alignItems: 'center', gap: space[2], borderRadius: radius.plate, backgroundColor: dark ? colors.paper : colors.spruce, paddingLeft: number === undefined ? 10 : 6, paddingRight: 10 }}>
      {number === undefined ? null : (
        <View style={{ minWidth: 18, height: 18, borderRadius: 4, alignItems: 'center', justifyContent: 'center', backgroundColor: dark ? colors.spruce : colors.paper }}>
          <Text variant="plate" color={dark ? 'paper' : 'ink'} style={{ letterSpacing: 0, lineHeight: 18 }}>{String(number)}</Text>
        </View>
      )}
      <Text variant="plate" color={dark ? 'ink' : 'paper'}>{children}</Text>
    </View>
  );
}
