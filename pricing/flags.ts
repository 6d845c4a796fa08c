import type { Flag } from '../shared/quote';
import type { CompiledEdition } from './rulebook/compile';
import type { FlagContext } from './rulebook/names';

/** The flags that hold, in the rulebook's order. Dangers come first there. */
export const raisedFlags = (compiled: CompiledEdition, context: FlagContext): Flag[] =>
  compiled.flags
    .filter(({ when }) => when(context) === true)
    .map(({ flag: { id, words, deskWords, danger } }) => ({ id, words, deskWords, danger }));

/** True when anything stops an automatic price. */
export const isFlagged = (compiled: CompiledEdition, context: FlagContext): boolean =>
  compiled.flags.some(({ when }) => when(context) === true);
