import { loadIds } from '../../shared/loads';

interface Tile { readonly present: boolean | null; readonly amount: number | null }
export type Board = Readonly<Partial<Record<string, Tile>>>;

/** The board as answered so far. */
export const boardOf = (answer: unknown): Board => (typeof answer === 'object' && answer !== null ? (answer as Board) : {});

/** The board once the person goes on: tiles left alone say what they showed, "No". */
export const fullBoard = (answer: unknown): Board => {
  const board = boardOf(answer);
  return Object.fromEntries(loadIds.map((id) => [id, board[id] ?? { present: false, amount: null }]));
};
