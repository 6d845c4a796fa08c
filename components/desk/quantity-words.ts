/** "45 ft", "4" for pieces, "5 × 10 ft stick" where the unit begins with a number of its own. */
export function quantityInWords(quantity: number, unit: string): string {
  const count = quantity.toLocaleString('en-US');
  if (unit === 'each') return count;
  return /^\d/.test(unit) ? `${count}\u00a0×\u00a0${unit}` : `${count}\u00a0${unit}`;
}
