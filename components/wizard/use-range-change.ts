import { useEffect, useRef, useState } from 'react';
import type { LiveRange } from '../../shared/quote';
import { spokenChange, standOf, type RangeStand } from './range-change';

const ONE_MESSAGE_MS = 1_000;

/**
 * Remembers the range before the last change, for the hatched part of the tape, and gives the polite message about it,
 * at most one a second: changes in between are told together.
 */
export function useRangeChange(range: LiveRange | undefined): { before: RangeStand | null; message: string } {
  const stand = standOf(range);
  const key = stand ? `${stand.lowCents}-${stand.highCents}` : '';
  const [seen, setSeen] = useState<{ key: string; stand: RangeStand | null; before: RangeStand | null }>({ key: '', stand: null, before: null });
  if (seen.key !== key) setSeen({ key, stand, before: seen.stand });
  const before = seen.key === key ? seen.before : seen.stand;

  const [message, setMessage] = useState('');
  const told = useRef<{ at: number; stand: RangeStand | null }>({ at: 0, stand: null });
  useEffect(() => {
    if (!stand) return undefined;
    const first = told.current.stand === null;
    const wait = Math.max(0, told.current.at + ONE_MESSAGE_MS - Date.now());
    const timer = setTimeout(() => {
      if (!first) setMessage(spokenChange(told.current.stand, stand));
      told.current = { at: Date.now(), stand };
    }, wait);
    return () => clearTimeout(timer);
    // `key` stands for both ends of the range.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [key]);

  return { before, message };
}
