import type { WireAllowance } from './wire-length';

export type ItemUnit = 'ft' | 'each' | '10 ft stick';
/** One thing on the pick list. `item` is its key in the price book; things of one key may differ in words (wire by color). */
export interface TakeoffItem { readonly item: string; readonly words: string; readonly quantity: number; readonly unit: ItemUnit }
/** One task, in the unit of the rulebook's hours. */
export interface TakeoffTask { readonly task: string; readonly quantity: number; readonly unit: '10 ft' | 'ft' | 'each' }
export interface Takeoff { readonly items: readonly TakeoffItem[]; readonly tasks: readonly TakeoffTask[] }

export interface TakeoffOptions extends WireAllowance {
  readonly connection: 'wired' | 'plug_in';
  /** Chargers that we bring. */
  readonly chargersSupplied: number;
}
