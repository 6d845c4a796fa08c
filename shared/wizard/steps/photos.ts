import type { Step } from '../field';

/** Places for photos: what each is for and which facts it is evidence of. Each is optional. */
export const photoSlots = [
  { id: 'panel', number: 1, name: 'Panel, door open', hint: 'Door open, cover on. All the breakers in the picture.', facts: ['blankSpaces', 'panelCondition', 'panelMount', 'solarAmps'] },
  { id: 'label', number: 2, name: 'Panel label, close', hint: 'Stand close and square to the sticker or the main breaker.', facts: ['mainBreakerAmps', 'busRatingAmps'] },
  { id: 'wall', number: 3, name: 'Charger wall', hint: 'The whole wall where the charger goes.', facts: ['wallFinish', 'chargerAt'] },
  { id: 'way', number: 4, name: 'The way between', hint: 'From the charger’s place, looking to the panel.', facts: ['pacesToPanel', 'room'] },
  { id: 'meter', number: 5, name: 'Meter', hint: 'The meter and the pipe or wires that reach it.', facts: ['serviceDrop', 'solarAmps'] },
] as const;
export type PhotoSlotId = (typeof photoSlots)[number]['id'];
export const photoSlotIds = photoSlots.map((slot) => slot.id) as [PhotoSlotId, ...PhotoSlotId[]];

/** Step 6: photos. They are no fields: each is stored as it arrives. */
export const photos: Step = {
  id: 'photos', number: 6, short: 'Photos',
  groups: [{ id: 'photos', title: 'Five photos, then your price', short: 'photos', hint: 'Skip any you like. The range stays wider.', cautions: ['cover', 'ladders'], why: 'The electrician reads what is hard to describe. Where the picture was taken is removed before it is kept.', fields: [] }],
  summary: () => '',
};
