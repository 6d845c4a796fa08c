import type { QuoteOption } from '../../shared/quote';
import { LoadSheetView } from '../price/load-sheet-view';
import { DeskCard } from './desk-card';
import { DeskRows } from './desk-rows';
import { quantityInWords } from './quantity-words';

/** The load calculation as a permit office reads it. */
export const LoadCard = ({ option }: { readonly option: QuoteOption }) => (
  <DeskCard title="Load calculation"><LoadSheetView sheet={option.load} /></DeskCard>
);

/** How the circuit came to be: each figure with its clause. */
export const CircuitCard = ({ option }: { readonly option: QuoteOption }) => (
  <DeskCard title="Circuit" aside={option.circuit.words}>
    <DeskRows label="Circuit" rows={option.trace.map((entry, index) => ({ key: `${index}`, title: entry.what, note: entry.clause, value: entry.value }))} />
  </DeskCard>
);

/** What the van has to carry, in the middle case. */
export const PickListCard = ({ option }: { readonly option: QuoteOption }) => (
  <DeskCard title="Pick list" aside={`${option.laborHours.toLocaleString('en-US', { maximumFractionDigits: 1 })}\u00a0h of work`}>
    <DeskRows
      label="Pick list"
      rows={option.takeoff.map(({ words, quantity, unit }, index) => ({ key: `${index}`, title: words, value: quantityInWords(quantity, unit) }))}
    />
  </DeskCard>
);
