import { Slot } from 'expo-router';
import { useMemo, useState } from 'react';
import { SearchProvider } from './search-context';

/** Around every page of the desk: keeps what is searched for while one looks at a lead and comes back. */
export function DeskLayout() {
  const [search, setSearch] = useState('');
  const value = useMemo(() => ({ search, setSearch }), [search]);
  return <SearchProvider value={value}><Slot /></SearchProvider>;
}
