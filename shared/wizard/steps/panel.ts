import { choice, many, wordAnswer, type Step } from '../field';

const inGarage = ['attached_garage', 'detached_garage'];

/** Step 3: the electrical panel, read through its open door. */
export const panel: Step = {
  id: 'panel', number: 3, short: 'Panel',
  groups: [
    {
      id: 'main', title: 'What number is on your main breaker?', short: 'main breaker', hint: 'It is the biggest handle, at the very top or bottom. The number is printed on it.',
      drawing: 'panel', cautions: ['cover', 'noSwitching'], why: 'A bigger main and two blank spaces usually mean no new panel.',
      fields: [
        choice({ id: 'mainBreakerAmps', label: 'Main breaker', name: 'Main breaker', columns: 3,
          unsure: { label: 'Not sure', note: 'Fine. A photo of the label will tell us.', photo: 'label' },
          choices: [
            { value: '60', label: '60 A' }, { value: '70', label: '70 A' }, { value: '100', label: '100 A' }, { value: '125', label: '125 A' },
            { value: '150', label: '150 A' }, { value: '175', label: '175 A' }, { value: '200', label: '200 A' }, { value: '225', label: '225 A' },
            { value: '320', label: '320 A' }, { value: '400', label: '400 A' }, { value: '0', label: 'There is none' },
          ] }),
      ],
    },
    {
      id: 'spaces', title: 'How many blank spaces, one above another?', short: 'blank spaces', hint: 'A blank space has a cover plate and no handle.', cautions: ['cover'],
      fields: [
        choice({ id: 'blankSpaces', label: 'Blank spaces', name: 'Blank spaces', columns: 3,
          unsure: { label: 'Not sure', note: 'Fine. A photo of the open door will tell us.', photo: 'panel' },
          choices: [{ value: '0', label: 'None' }, { value: '1', label: 'One' }, { value: '2', label: 'Two or more' }] }),
      ],
    },
    {
      id: 'odd', title: 'Anything odd about the panel?', short: 'condition', cautions: ['danger', 'screwed'], hint: 'Look and listen from where you stand. Pick all that fit.',
      fields: [
        many({ id: 'panelCondition', label: 'What do you see or hear?', name: 'Condition', none: 'Nothing odd',
          unsure: { label: 'Not sure', note: 'Fine. A photo will tell us.', photo: 'panel' },
          choices: [
            { value: 'fuses', label: 'Fuses, not breakers' }, { value: 'rust_or_water', label: 'Rust or water' }, { value: 'warm', label: 'Warm to stand by' },
            { value: 'buzzing', label: 'Buzzing' }, { value: 'scorch', label: 'Scorch marks or a burnt smell' }, { value: 'screwed_shut', label: 'Door screwed shut' },
          ] }),
      ],
    },
    {
      id: 'where', title: 'Where is the panel?', short: 'where it is',
      fields: [
        choice({ id: 'panelPlace', label: 'The panel is', name: 'Panel place', columns: 2, unsure: { label: 'Not sure', note: 'Fine. We allow for the usual places.' },
          choices: [
            { value: 'garage_wall', label: 'On a garage wall' }, { value: 'next_room', label: 'In the room next to the garage' }, { value: 'elsewhere', label: 'Elsewhere in the house' },
            { value: 'outside', label: 'Outside on the house' }, { value: 'basement', label: 'In the basement' },
          ] }),
        choice({ id: 'panelMount', label: 'Is it in the wall or on it?', name: 'Mounting', columns: 2, unsure: { label: 'Not sure', note: 'Fine. Most are set in the wall.', photo: 'panel' },
          choices: [{ value: 'flush', label: 'Set in the wall' }, { value: 'surface', label: 'A box on the wall' }] }),
      ],
    },
    {
      id: 'supply', title: 'How does power reach the house?', short: 'power lines',
      fields: [
        choice({ id: 'serviceDrop', label: 'The power lines come', name: 'Power lines', columns: 2, unsure: { label: 'Not sure', note: 'Fine. A photo of the meter will tell us.', photo: 'meter' },
          choices: [{ value: 'overhead', label: 'Through the air' }, { value: 'underground', label: 'Out of the ground' }] }),
        choice({ id: 'solarAmps', label: 'Do solar panels feed this panel?', name: 'Solar', columns: 2, unsure: { label: 'Not sure', note: 'Fine. A photo of the open door will tell us.', photo: 'panel' },
          choices: [{ value: '0', label: 'No' }, { value: '20', label: 'Yes, 20 A breaker' }, { value: '30', label: 'Yes, 30 A breaker' }, { value: '40', label: 'Yes, 40 A breaker' }, { value: '60', label: 'Yes, 60 A breaker' }] }),
      ],
    },
  ],
  check: (answers) =>
    answers.panelPlace === 'garage_wall' && typeof answers.parking === 'string' && !inGarage.includes(answers.parking)
      ? [{ field: 'panelPlace', detail: 'You park in the open, so pick where the panel is in or on the house.' }]
      : [],
  summary: (answers) => {
    const main = wordAnswer(answers, 'mainBreakerAmps');
    const spaces = wordAnswer(answers, 'blankSpaces');
    const words = spaces === null ? null : ['no blank space', 'one blank space', 'two blank spaces'][Number(spaces)];
    return [main === null ? 'Main not read yet' : main === '0' ? 'No main' : `${main} A`, words].filter(Boolean).join(', ');
  },
};
