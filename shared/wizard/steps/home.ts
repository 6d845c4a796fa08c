import { z } from '../../zod';
import { choice, number, wordAnswer, type Step, type TextField } from '../field';

const zip: TextField = {
  kind: 'text', id: 'zip', label: 'ZIP code', name: 'ZIP', hint: 'Five digits, where the charger will be.', inputMode: 'numeric', autoComplete: 'postal-code', maxLength: 5,
  schema: z.string().regex(/^\d{5}$/, { error: 'Type the five digits of the ZIP' }),
  words: String,
};

/** Step 1: where, what kind of home, whose, and where the car stands. */
export const home: Step = {
  id: 'home', number: 1, short: 'Home',
  groups: [
    { id: 'place', title: 'Where is the home?', short: 'the place', why: 'The town decides the permit, its fee and the inspector.', fields: [zip] },
    {
      id: 'kind', title: 'What kind of home is it?', short: 'kind of home',
      fields: [
        choice({ id: 'homeKind', label: 'Kind of home', name: 'Home', columns: 2, choices: [
          { value: 'house', label: 'House' }, { value: 'town_house', label: 'Town house' },
          { value: 'flat', label: 'Apartment or condo' }, { value: 'mobile_home', label: 'Mobile home' },
        ] }),
        choice({ id: 'tenure', label: 'Do you own it?', name: 'Owner', columns: 3, choices: [
          { value: 'own', label: 'I own it' }, { value: 'rent_with_consent', label: 'I rent, and the owner agrees' }, { value: 'rent', label: 'I rent' },
        ] }),
        choice({ id: 'parking', label: 'Where does the car stand?', name: 'Parking', columns: 2, choices: [
          { value: 'attached_garage', label: 'Attached garage' }, { value: 'detached_garage', label: 'Detached garage' },
          { value: 'carport', label: 'Carport' }, { value: 'driveway', label: 'Driveway' },
        ] }),
      ],
    },
    {
      id: 'age', title: 'How old and how big is it?', short: 'age and size', why: 'Age hints at the panel. Size sets the load calculation.',
      fields: [
        choice({ id: 'yearBuilt', label: 'Roughly when was it built?', name: 'Built', columns: 2,
          unsure: { label: 'Not sure', note: 'Fine. We allow for any age.' },
          choices: [
            { value: 'before_1965', label: 'Before 1965' }, { value: '1965_1989', label: '1965 to 1989' },
            { value: '1990_2009', label: '1990 to 2009' }, { value: '2010_or_later', label: '2010 or later' },
          ] }),
        number({ id: 'floorAreaFt2', label: 'How big is the living space?', name: 'Living space', hint: 'Measured outside. Leave out the garage and open porches.',
          unit: 'sq ft', min: 300, max: 8000, step: 100, start: 1800, unsure: { label: 'Not sure', note: 'Fine. We allow for the usual sizes.' } }),
      ],
    },
  ],
  summary: (answers) => {
    const kind = home.groups[1]?.fields[0]?.words(wordAnswer(answers, 'homeKind')) ?? '';
    const own = wordAnswer(answers, 'tenure') === 'own' ? 'owned' : 'rented';
    return [kind, own].filter(Boolean).join(', ');
  },
};
