import { DOCUMENT_SAMPLES, liveRange, priceIntake } from '../../../pricing/quote';
import { editionOne } from '../../../pricing/rulebook/edition-1/index';
import { factsOf } from '../../../shared/api/intake-input';
import { exampleIntake } from '../example-intake';
import { quantile, type Row } from './table';

const warmUps = 20;

/** Measures the price of the example home: all options with their trace, and the range when two of its facts are not known. */
export function pricingTimeRows(): Row[] {
  const pricedOn = exampleIntake.pricedOn ?? '2026-05-12';
  const known = factsOf(exampleIntake);
  const unsure = { ...known, panelPlace: null, panelAt: null, blankSpaces: null };
  const quote = timed(200, () => priceIntake({ facts: known, edition: editionOne, pricedOn, samples: 1 }));
  const range = timed(20, () => priceIntake({ facts: unsure, edition: editionOne, pricedOn, samples: DOCUMENT_SAMPLES }));
  const live = timed(20, () => liveRange({ facts: unsure, edition: editionOne }));
  return [
    row('full quote with trace, all options, no range, median', quote, 0.15),
    row(`quote with its range, ${DOCUMENT_SAMPLES.toLocaleString('en-US')} samples, median`, range, 60),
    { what: 'range while answering, median', measured: `${live.toFixed(2)} ms`, target: '', reached: null },
  ];
}

/** The median of so many calls, in milliseconds, after the engine has warmed up. */
function timed(times: number, work: () => unknown): number {
  for (let index = 0; index < warmUps; index += 1) work();
  const durations = Array.from({ length: times }, () => {
    const startedAt = performance.now();
    work();
    return performance.now() - startedAt;
  });
  return quantile(durations, 0.5);
}

const row = (what: string, measuredMs: number, limitMs: number): Row =>
  ({ what, measured: `${measuredMs.toFixed(2)} ms`, target: `${limitMs} ms or less`, reached: measuredMs <= limitMs });
