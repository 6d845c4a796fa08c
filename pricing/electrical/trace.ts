/** How one figure came to be: what it is, its value in words, and the clause that made it. */
export interface TraceEntry { readonly what: string; readonly value: string; readonly clause: string }

/** One line of a load calculation sheet. `va` is what the line shows; the note says how it counts. */
export interface SheetLine { readonly label: string; readonly va: number; readonly clause: string; readonly note?: string }

/** Rounds off what floating point leaves behind (0.82 x 75), so that a limit met exactly counts as met. */
export const tidy = (value: number): number => Math.round(value * 1e6) / 1e6;
