import { Pressable, View } from 'react-native';
import type { Lead } from '../../shared/api/desk';
import type { FactSource } from '../../shared/facts';
import { countInWords } from '../../shared/units';
import { photoSlots } from '../../shared/wizard/steps/photos';
import { Disclosure } from '../ui/disclosure';
import { Text } from '../ui/text';
import { DeskCard } from './desk-card';
import { DeskRows, type DeskRow } from './desk-rows';

const SOURCES: Readonly<Record<FactSource, string>> = { homeowner: 'answer', photo: 'from a photo', usage: 'usage file', estimator: 'estimator', assumed: 'assumed' };

type Fact = Lead['facts'][number];

export interface LeadFactsProps {
  readonly lead: Lead;
  readonly onShowPhoto: (slot: string) => void;
}

/**
 * What is known and where it is from. First what the desk has to look at: what a photo shows, what is assumed, what was changed after
 * the price was made; the other answers fold away.
 */
export function LeadFacts({ lead, onShowPhoto }: LeadFactsProps) {
  const sent = new Set(lead.photos.map((photo) => photo.slot));
  const slotOf = (fact: Fact) => photoSlots.find((slot) => sent.has(slot.id) && slot.facts.some((name) => name === fact.name));
  const changeOf = (fact: Fact) => lead.differences.find((difference) => difference.label === fact.label);
  const toCheck = lead.facts.filter((fact) => fact.source === 'assumed' || slotOf(fact) || changeOf(fact));
  const others = lead.facts.filter((fact) => !toCheck.includes(fact));
  const rowOf = (fact: Fact): DeskRow => {
    const slot = slotOf(fact);
    const change = changeOf(fact);
    return {
      key: fact.name, title: fact.label, value: fact.words, ...(change ? { before: change.before } : {}),
      note: slot ? (
        <Evidence words={SOURCES[fact.source]} number={slot.number} fact={fact.label} onPress={() => onShowPhoto(slot.id)} />
      ) : SOURCES[fact.source],
    };
  };
  const assumed = lead.facts.filter((fact) => fact.source === 'assumed').length;
  return (
    <DeskCard title="Facts" aside={assumed === 0 ? 'None assumed' : `${assumed} of ${lead.facts.length} assumed`}>
      {toCheck.length > 0 ? <DeskRows label="Facts to check" rows={toCheck.map(rowOf)} /> : null}
      {others.length > 0 ? (
        <Disclosure label={countInWords(others.length, 'more answer', 'more answers')}><DeskRows label="Other answers" rows={others.map(rowOf)} /></Disclosure>
      ) : null}
      {lead.facts.length === 0 ? <Text color="ink2">Nothing is answered yet.</Text> : null}
    </DeskCard>
  );
}

interface EvidenceProps {
  readonly words: string;
  readonly number: number;
  readonly fact: string;
  readonly onPress: () => void;
}

function Evidence({ words, number, fact, onPress }: EvidenceProps) {
  return (
    <View style={{ flexDirection: 'row', alignItems: 'center' }}>
      <Text variant="fine" weight={500} color="ink2">{`${words} · `}</Text>
      <Pressable role="button" aria-label={`Show photo ${number} for ${fact}`} onPress={onPress} style={{ minHeight: 32, justifyContent: 'center' }}>
        <Text variant="fine" weight={700} color="lake">{`photo ${number}`}</Text>
      </Pressable>
    </View>
  );
}
