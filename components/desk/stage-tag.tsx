import { View } from 'react-native';
import { leadStageWords, type LeadStage } from '../../shared/api/desk';
import { StatusTag, type StatusKind } from '../ui/status-tag';

const KINDS: Readonly<Record<LeadStage, StatusKind>> = {
  'check-photos': 'check-photos', 'waiting-on-photo': 'waiting', 'needs-a-visit': 'visit', 'firm-price-sent': 'sent',
  accepted: 'accepted', booked: 'booked', closed: 'quiet',
};

/** Where a lead stands; as wide as its words, in a table's cell too. */
export const StageTag = ({ stage }: { readonly stage: LeadStage }) => (
  <View style={{ flexDirection: 'row' }}><StatusTag kind={KINDS[stage]} label={leadStageWords[stage]} /></View>
);
