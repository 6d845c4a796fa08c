import { View } from 'react-native';
import { loadKinds, type LoadKind } from '../../../shared/loads';
import { amountUnit } from '../../../shared/wizard/steps/loads';
import { space } from '../../theme/tokens';
import { BreakerBoard } from '../../ui/breaker-board';
import { NumberStepper } from '../../ui/number-stepper';
import { boardOf, type Board } from '../full-board';
import { useWizard } from '../wizard-context';

const kinds: readonly LoadKind[] = loadKinds;
const TYPING_MS = 400;
/** Steps and starting points of the amounts: common sizes, common practice, no source. */
const AMOUNTS = {
  tons: { step: 0.5, start: 3 }, kilowatts: { step: 1, start: 10 }, count: { step: 1, start: 4 }, amps: { step: 1, start: 32 },
  none: { step: 1, start: 1 },
} as const;

/** The board of big loads, and under it the sizes of those that are there and have one. */
export function LoadsInput({ label }: { label: string }) {
  const { answers, answer, hold } = useWizard();
  const board = boardOf(answers.loads);
  const errors = amountErrors(board);
  const put = (id: string, tile: { present: boolean | null; amount: number | null }, waitMs = 0) => {
    const given = { ...board, [id]: tile };
    if (Object.keys(amountErrors(given)).length > 0) hold('loads', given);
    else answer('loads', given, waitMs);
  };
  const sized = kinds.filter((kind) => kind.amount !== 'none' && board[kind.id]?.present === true);

  return (
    <View nativeID="loads" style={{ gap: space[5] }}>
      <BreakerBoard
        label={label}
        tiles={kinds.map((kind) => {
          const tile = board[kind.id];
          const amount = tile?.amount;
          return {
            id: kind.id, title: kind.title, state: tile === undefined ? false : tile.present,
            ...(amount == null ? {} : { stateWords: `${amount} ${amountUnit(kind, amount)}` }),
          };
        })}
        onChange={(id, present) => put(id, { present, amount: present === true ? (board[id]?.amount ?? null) : null })}
      />
      {sized.map((kind) => (
        <NumberStepper
          key={kind.id} id={`loads-${kind.id}`} label={kind.amountLabel ?? kind.title} optional
          {...(kind.amountHint ? { hint: kind.amountHint } : {})}
          unit={amountUnit(kind, 2)} min={kind.min ?? 0} max={kind.max ?? 100} {...AMOUNTS[kind.amount]}
          error={errors[kind.id] ?? null}
          value={board[kind.id]?.amount ?? null}
          onChange={(amount) => put(kind.id, { present: true, amount: amount === 0 ? null : amount }, TYPING_MS)}
        />
      ))}
    </View>
  );
}

/** What is wrong with a size, by load: out of the limits that the person can see. */
const amountErrors = (board: Board): Readonly<Record<string, string>> =>
  Object.fromEntries(kinds.flatMap((kind) => {
    const amount = board[kind.id]?.amount;
    const out = amount != null && (amount < (kind.min ?? 0) || amount > (kind.max ?? Infinity));
    return out ? [[kind.id, `Between ${kind.min ?? 0} and ${kind.max ?? 0} ${amountUnit(kind, 2)}`]] : [];
  }));
