import type { QuoteDocument } from '../../shared/quote';

/** The document of a stored quote. We wrote it ourselves, validated by its type, and the database refuses any change of it. */
export const readDocument = ({ document }: { readonly document: string }): QuoteDocument => JSON.parse(document) as QuoteDocument;
