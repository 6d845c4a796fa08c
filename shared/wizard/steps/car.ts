import { choice, number, numberAnswer, wordAnswer, type Answers, type Step } from '../field';

const theirs = (answers: Answers) => answers.chargerSupply === 'theirs';
/** Amps of a choice value: choices are words, facts are numbers. */
const amps = (answers: Answers, id: string) => Number(wordAnswer(answers, id) ?? Number.NaN);

/** Step 2: what the car takes, what it has to do, and the charger. */
export const car: Step = {
  id: 'car', number: 2, short: 'Car',
  groups: [
    {
      id: 'rate', title: 'How fast can your car take power at home?', short: 'charging rate', drawing: 'car', why: 'A faster circuit than the car can use is money for nothing.',
      fields: [
        choice({ id: 'carMaxAmps', label: 'Highest charging rate', name: 'Car takes', columns: 3,
          hint: 'In the owner’s manual under “AC charging” or “on-board charger”, in amps or kW.',
          unsure: { label: 'Not sure', note: 'Fine. We price a circuit that suits most cars.' },
          choices: [
            { value: '16', label: '16 A', note: '3.8 kW' }, { value: '24', label: '24 A', note: '5.8 kW' }, { value: '32', label: '32 A', note: '7.7 kW' },
            { value: '40', label: '40 A', note: '9.6 kW' }, { value: '48', label: '48 A', note: '11.5 kW' }, { value: '80', label: '80 A', note: '19.2 kW' },
          ],
          remark: (answers) => {
            const [carAmps, chargerAmps] = [amps(answers, 'carMaxAmps'), amps(answers, 'chargerMaxAmps')];
            return theirs(answers) && carAmps > chargerAmps ? `Your charger gives ${chargerAmps} A at most, so that sets the pace. The car can take more.` : null;
          } }),
        choice({ id: 'whPerMile', label: 'What size of car?', name: 'Car size', columns: 2,
          unsure: { label: 'Not sure', note: 'Fine. We take a mid-size car.' },
          choices: [
            { value: '260', label: 'Small' }, { value: '300', label: 'Mid-size' }, { value: '380', label: 'Large' }, { value: '480', label: 'Pick-up' },
          ] }),
      ],
    },
    {
      id: 'days', title: 'What is a usual day?', short: 'usual day', why: 'Most cars fill up overnight on far less than the fastest circuit.',
      fields: [
        number({ id: 'milesPerDay', label: 'Miles on a usual day', name: 'Usual day', unit: 'miles', min: 1, max: 300, step: 5, start: 35, unsure: { label: 'Not sure', note: 'Fine. We take 35 miles.' } }),
        number({ id: 'hoursHome', label: 'Hours it stands at home overnight', name: 'Hours at home', unit: 'hours', min: 3, max: 24, step: 1, start: 10, unsure: { label: 'Not sure', note: 'Fine. We take 10 hours.' } }),
        choice({ id: 'secondCar', label: 'A second electric car within some years?', name: 'Second car', columns: 3,
          unsure: { label: 'Not sure', note: 'Fine. We show what room there is.' },
          choices: [{ value: 'no', label: 'No' }, { value: 'maybe', label: 'Maybe' }, { value: 'yes', label: 'Yes' }] }),
      ],
    },
    {
      id: 'charger', title: 'Whose charger will it be?', short: 'charger',
      fields: [
        choice({ id: 'chargerSupply', label: 'Do you have a charger?', name: 'Charger', columns: 2, choices: [
          { value: 'ours', label: 'No, bring one', note: 'Supplied and under our warranty' }, { value: 'theirs', label: 'Yes, I have one' },
        ] }),
        choice({ id: 'chargerMaxAmps', label: 'Its highest setting', name: 'Charger setting', columns: 3, when: theirs, hint: 'On its label, in amps. Not the breaker size.',
          unsure: { label: 'Not sure', note: 'Fine. A photo of its label will tell us.' },
          choices: [{ value: '16', label: '16 A' }, { value: '24', label: '24 A' }, { value: '32', label: '32 A' }, { value: '40', label: '40 A' }, { value: '48', label: '48 A' }, { value: '80', label: '80 A' }] }),
        choice({ id: 'chargerConnection', label: 'Wired in or with a plug?', name: 'Connection', columns: 2, when: theirs,
          unsure: { label: 'Not sure', note: 'Fine. We price both.' },
          choices: [{ value: 'wired', label: 'Wired in' }, { value: 'plug_in', label: 'With a plug' }] }),
        number({ id: 'cableLengthFt', label: 'How long is its cable?', name: 'Cable', unit: 'ft', min: 12, max: 25, step: 1, start: 18, when: theirs, unsure: { label: 'Not sure', note: 'Fine. 18 ft is common.' } }),
      ],
    },
  ],
  check: (answers) =>
    theirs(answers) && answers.chargerConnection === 'plug_in' && amps(answers, 'chargerMaxAmps') > 40
      ? [{ field: 'chargerConnection', detail: 'A charger with a plug gives 40 A at most. Check its label, or pick “Wired in”.' }]
      : [],
  summary: (answers) => {
    const rate = wordAnswer(answers, 'carMaxAmps');
    const miles = numberAnswer(answers, 'milesPerDay');
    return rate ? `Charges up to ${rate} A` : miles ? `About ${miles} miles a day` : 'Rate to be seen';
  },
};
