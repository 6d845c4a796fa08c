import { useState } from 'react';
import { View } from 'react-native';
import { leadStageWords, type Lead, type LeadStage } from '../../shared/api/desk';
import { failureWords, isProblem } from '../api/client';
import { useMoveLead } from '../api/use-leads';
import { space } from '../theme/tokens';
import { Button } from '../ui/button';
import { CautionBox } from '../ui/caution-box';
import { Field } from '../ui/field';
import { Link } from '../ui/link';
import { Select } from '../ui/select';
import { Text } from '../ui/text';
import { DeskCard } from './desk-card';
import { StageTag } from './stage-tag';

export interface MoveStageProps {
  readonly lead: Lead;
  readonly csrfToken: string;
  /** Fetches the lead anew. */
  readonly onReload: () => void;
  readonly reloading: boolean;
}

/** Moves the lead to a stage that is open from here. When somebody was faster it says so, keeps the note, and offers the newest state. */
export function MoveStage({ lead, csrfToken, onReload, reloading }: MoveStageProps) {
  const move = useMoveLead(lead.id, csrfToken);
  const [picked, setPicked] = useState<LeadStage | null>(null);
  const [note, setNote] = useState('');
  const [moved, setMoved] = useState('');
  const stage = picked !== null && lead.moves.includes(picked) ? picked : null;
  const submit = () => {
    if (stage === null) return;
    const done = () => {
      setMoved(`Moved to “${leadStageWords[stage]}”.`);
      setPicked(null);
      setNote('');
    };
    move.mutate({ stage, note, version: lead.version }, { onSuccess: done });
  };
  const reload = () => { move.reset(); onReload(); };
  return (
    <DeskCard title="Stage">
      <View style={{ flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', gap: space[3] }}>
        <StageTag stage={lead.stage} />
        <Text role="status" variant="note" weight={700} color="ok">{moved}</Text>
      </View>
      <View role="alert"><Trouble error={move.error} onReload={reload} reloading={reloading} /></View>
      <Select id="move-stage" label="Move to" size="desk" value={stage} placeholder="Pick a stage" choices={lead.moves.map((id) => ({ value: id, label: leadStageWords[id] }))}
        onChange={(value) => { setMoved(''); setPicked(lead.moves.find((id) => id === value) ?? null); }} />
      {stage === null ? null : (
        <>
          <Field id="move-note" label="Note for the history" optional value={note} onChangeText={setNote} maxLength={500} />
          <Button label={`Move to “${leadStageWords[stage]}”`} busyLabel="Moving" size="desk" busy={move.isPending} onPress={submit} />
        </>
      )}
    </DeskCard>
  );
}

function Trouble({ error, onReload, reloading }: { readonly error: unknown; readonly onReload: () => void; readonly reloading: boolean }) {
  if (!error) return null;
  if (isProblem(error, 412, 409)) {
    return (
      <CautionBox
        level="note" title="Someone else changed this first"
        action={<Button label="Show the newest" busyLabel="Loading" kind="quiet" size="desk" busy={reloading} onPress={onReload} />}
      >
        {`${failureWords(error)} Nothing was moved; your note is kept.`}
      </CautionBox>
    );
  }
  if (isProblem(error, 401)) {
    const again = <Link label="Sign in again" href="/desk/sign-in" />;
    return <CautionBox level="note" title="Your sign-in has run out" action={again}>Nothing was moved.</CautionBox>;
  }
  return <CautionBox level="stop" title="Not moved">{failureWords(error)}</CautionBox>;
}
