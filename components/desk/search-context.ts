import { createContext, useContext } from 'react';

/** What is searched for in the leads. Often a person's name, so it is kept here and never in an address. */
export interface LeadSearch {
  readonly search: string;
  readonly setSearch: (search: string) => void;
}

const SearchContext = createContext<LeadSearch>({ search: '', setSearch: () => undefined });
export const SearchProvider = SearchContext.Provider;
export const useLeadSearch = (): LeadSearch => useContext(SearchContext);
