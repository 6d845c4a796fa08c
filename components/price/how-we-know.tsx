import { View } from 'react-native';
import type { QuoteDocument, QuoteOption } from '../../shared/quote';
import { space } from '../theme/tokens';
import { Card } from '../ui/card';
import { Directory } from '../ui/directory';
import { Disclosure } from '../ui/disclosure';
import { Link } from '../ui/link';
import { Text } from '../ui/text';
import { LoadSheetView } from './load-sheet-view';

export interface HowWeKnowProps {
  readonly document: QuoteDocument;
  readonly option: QuoteOption;
  /** The answers can no longer be changed here. */
  readonly fixed?: boolean;
}

/** The circuit, the load calculation and the answers behind the price, for who wants to look. */
export function HowWeKnow({ document, option, fixed = false }: HowWeKnowProps) {
  return (
    <View style={{ gap: space[3] }}>
      <Text variant="heading" level={2}>How we know</Text>
      <Card>
        <Disclosure label="The circuit, and the code behind it">
          <Directory label="The circuit" start={null} items={option.trace.map((entry, index) => ({ key: `${index}`, title: entry.what, note: entry.clause, value: entry.value }))} />
        </Disclosure>
        <Disclosure label="The load calculation"><LoadSheetView sheet={option.load} /></Disclosure>
        <Disclosure label="Your answers">
          <Directory label="Your answers" start={null} items={document.facts.map((fact) => ({ key: fact.name, title: fact.label, value: fact.words }))} />
        </Disclosure>
        {fixed ? null : <Link label="Check or change your answers" href="/quote/check" />}
      </Card>
      {document.cautions.map((caution) => <Text key={caution} variant="note" color="ink2">{caution}</Text>)}
      <Text variant="fine" color="ink2">{`Rulebook ${document.rulebookEdition} · ${document.codeEdition} NEC · ${document.jurisdiction.name}`}</Text>
    </View>
  );
}
