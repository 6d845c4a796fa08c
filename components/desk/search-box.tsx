import Search from 'lucide-react-native/icons/search';
import { useEffect, useState } from 'react';
import { StyleSheet, TextInput, View } from 'react-native';
import { border, colors, radius, space, typeStyle } from '../theme/tokens';
import { Glyph } from '../ui/glyph';

const PAUSE_MS = 300;

/** Searches leads after a short pause in typing; Enter searches at once. */
export function SearchBox({ value, onSearch }: { readonly value: string; readonly onSearch: (search: string) => void }) {
  const [typed, setTyped] = useState(value);
  const [known, setKnown] = useState(value);
  const wanted = typed.trim();
  // Emptied from elsewhere ("Show all leads"): the box follows; its own searches come back as `wanted` and leave the typing alone.
  if (value !== known) {
    setKnown(value);
    if (value !== wanted) setTyped(value);
  }
  useEffect(() => {
    if (wanted === value) return undefined;
    const timer = setTimeout(() => onSearch(wanted), PAUSE_MS);
    return () => clearTimeout(timer);
  }, [wanted, value, onSearch]);
  return (
    <View style={styles.frame} dataSet={{ control: 'frame' }}>
      <Glyph of={Search} color="ink2" />
      <TextInput
        aria-label="Search leads by name, street or job number" placeholder="Name, street or job number" placeholderTextColor={colors.ink3} value={typed} maxLength={100}
        onChangeText={setTyped} onSubmitEditing={() => onSearch(wanted)} inputMode="search" autoComplete="off" dataSet={{ control: 'inner' }} style={styles.box}
      />
    </View>
  );
}

const styles = StyleSheet.create({
  frame: {
    flexDirection: 'row', alignItems: 'center', gap: space[2], minHeight: 44, flexGrow: 1, flexShrink: 1, flexBasis: 270, paddingLeft: space[3],
    borderRadius: radius.small, borderWidth: border.control, borderColor: colors.edge, backgroundColor: colors.card,
  },
  box: { ...typeStyle('body', 600), fontSize: 15, flex: 1, minWidth: 0, minHeight: 41, color: colors.ink, paddingRight: space[3] },
});
