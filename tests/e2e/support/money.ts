export interface Amount { readonly low: number; readonly high: number }

/** Reads "$1,640 – $2,080", "up to $945", "$95" or "Included" as whole cents. */
export function readAmount(words: string): Amount {
  if (/included/i.test(words)) return { low: 0, high: 0 };
  const cents = [...words.matchAll(/\$([\d,]+)(?:\.(\d\d))?/g)].map(([, whole = '', part = '0']) => Number(whole.replaceAll(',', '')) * 100 + Number(part));
  const [low, high = low] = /up to/.test(words) ? [0, ...cents] : cents;
  if (low === undefined || high === undefined) throw new Error(`No amount in "${words}"`);
  return { low, high };
}

export const addUp = (amounts: readonly Amount[]): Amount => amounts.reduce((sum, { low, high }) => ({ low: sum.low + low, high: sum.high + high }), { low: 0, high: 0 });
