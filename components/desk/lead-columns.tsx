import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { feetInWords } from '../../shared/units';
import { GaragePlan } from '../plan/garage-plan';
import { OptionTable } from '../price/option-table';
import { useBreakpoint } from '../theme/use-breakpoint';
import { DeskCard } from './desk-card';
import { LeadContact } from './lead-contact';
import { LeadFacts } from './lead-facts';
import { LeadHistory } from './lead-history';
import { LeadPhotos } from './lead-photos';
import { LeadPrice, takenOption } from './lead-price';
import { CircuitCard, LoadCard, PickListCard } from './lead-work';
import { MoveStage, type MoveStageProps } from './move-stage';

/** A lead's parts: evidence, facts and price side by side on wide windows; below, what they rest on. One column on phones. */
export function LeadColumns({ lead, nowMs, csrfToken, onReload, reloading }: MoveStageProps & { readonly nowMs: number }) {
  const breakpoint = useBreakpoint();
  const [shown, setShown] = useState('label');
  const option = takenOption(lead);
  const timeZone = lead.quote?.jurisdiction.timeZone ?? Intl.DateTimeFormat().resolvedOptions().timeZone;
  const photos = <LeadPhotos photos={lead.photos} shown={shown} onShow={setShown} />;
  const plan = lead.quote?.plan ? (
    <DeskCard title="Plan" {...(option ? { aside: `${feetInWords(Math.round(option.run.lengthFt))} run` } : {})}>
      <GaragePlan plan={lead.quote.plan} maxHeightPx={320} />
    </DeskCard>
  ) : null;
  const stage = lead.moves.length > 0 ? <MoveStage lead={lead} csrfToken={csrfToken} onReload={onReload} reloading={reloading} /> : null;
  const contact = <LeadContact lead={lead} timeZone={timeZone} nowMs={nowMs} />;
  const facts = <LeadFacts lead={lead} onShowPhoto={setShown} />;
  const price = <LeadPrice lead={lead} />;
  const history = <LeadHistory lead={lead} timeZone={timeZone} nowMs={nowMs} />;
  const offered = lead.quote?.options ?? [];
  const options = offered.length > 1 ? <DeskCard title="Options"><OptionTable options={offered} /></DeskCard> : null;
  const work = option ? [LoadCard, CircuitCard, PickListCard].map((Part, index) => <Part key={`${index}`} option={option} />) : [];
  if (breakpoint === 'wide') {
    return (
      <>
        <View style={styles.row}>
          <View style={[styles.column, styles.narrow]}>{photos}{plan}{contact}</View>
          <View style={[styles.column, styles.middle]}>{stage}{facts}{history}</View>
          <View style={[styles.column, styles.rest]}>{price}</View>
        </View>
        {options}
        <View style={styles.row}>{work.map((card) => <View key={card.key} style={[styles.column, styles.rest]}>{card}</View>)}</View>
      </>
    );
  }
  const tablet = breakpoint === 'tablet';
  return (
    <>
      <View style={[tablet && styles.row, !tablet && styles.column]}>
        <View style={[styles.column, tablet && styles.rest]}>{photos}{stage}{contact}</View>
        <View style={[styles.column, tablet && styles.rest]}>{plan}{facts}</View>
      </View>
      {price}{options}{work}{history}
    </>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', alignItems: 'flex-start', gap: 14 },
  column: { gap: 14, minWidth: 0 },
  narrow: { width: 296 },
  middle: { width: 376 },
  rest: { flex: 1 },
});
