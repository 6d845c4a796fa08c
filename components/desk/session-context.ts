import { createContext, useContext } from 'react';
import type { Session } from '../../shared/api/desk';

export interface Desk {
  readonly session: Session;
  /** What is searched for in the leads. Often a person's name, so it is kept here and never in an address. */
  readonly search: string;
  readonly setSearch: (search: string) => void;
}

const DeskContext = createContext<Desk | null>(null);
export const DeskProvider = DeskContext.Provider;

/** Who is signed in. @throws outside of the desk's frame */
export function useDesk(): Desk {
  const desk = useContext(DeskContext);
  if (!desk) throw new Error('This screen belongs inside of the desk');
  return desk;
}
