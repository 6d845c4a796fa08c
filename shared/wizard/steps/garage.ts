import { choice, number, numberAnswer, wordAnswer, type Answers, type Step } from '../field';

const garage = (answers: Answers) => answers.parking === 'attached_garage' || answers.parking === 'detached_garage';
const detached = (answers: Answers) => answers.parking === 'detached_garage';
const outdoors = (answers: Answers) => answers.parking === 'carport' || answers.parking === 'driveway';
const panelInGarage = (answers: Answers) => garage(answers) && answers.panelPlace === 'garage_wall';
const panelBeyond = (answers: Answers) => !panelInGarage(answers) && !detached(answers);
const hasHouseDoor = (answers: Answers) => garage(answers) && ['back', 'right', 'left'].includes(String(answers.houseDoorWall));

const wallChoices = [
  { value: 'back', label: 'Back wall', note: 'Opposite the garage door' }, { value: 'right', label: 'Right wall' },
  { value: 'left', label: 'Left wall' }, { value: 'front', label: 'Front wall', note: 'Beside the garage door' },
];
const yesNo = [{ value: 'yes', label: 'Yes' }, { value: 'no', label: 'No' }];

/** Inner length of a wall, ft, or null while the room is not measured. */
const wallFt = (answers: Answers, wall: unknown): number | null =>
  numberAnswer(answers, wall === 'back' || wall === 'front' ? 'roomWidthFt' : 'roomDepthFt');

const beyondWall = (answers: Answers, wallField: string, alongField: string, widthFt = 0) => {
  const along = numberAnswer(answers, alongField);
  const length = wallFt(answers, answers[wallField]);
  return along !== null && length !== null && along + widthFt > length
    ? [{ field: alongField, detail: `That wall is ${length} ft long. Pick a smaller distance.` }]
    : [];
};

const sizeUnsure = { label: 'Not sure', note: 'Fine. We allow for the usual sizes.' };

/** Step 5: the garage in measures, from which the plan and the run are drawn. */
export const garageStep: Step = {
  id: 'garage', number: 5, short: 'Garage',
  groups: [
    {
      id: 'size', title: 'How big is the garage?', short: 'size', hint: 'Stand at the garage door, looking in. Paces will do: one is about 2.5 ft.', drawing: 'plan', when: garage,
      fields: [
        number({ id: 'roomWidthFt', label: 'Width, left to right', name: 'Garage width', unit: 'ft', min: 8, max: 60, step: 0.5, start: 20, unsure: sizeUnsure }),
        number({ id: 'roomDepthFt', label: 'Depth, door to back', name: 'Garage depth', unit: 'ft', min: 8, max: 60, step: 0.5, start: 22, unsure: sizeUnsure }),
        number({ id: 'ceilingFt', label: 'Ceiling height', name: 'Ceiling', unit: 'ft', min: 7, max: 16, step: 0.5, start: 8.5, unsure: sizeUnsure }),
        number({ id: 'garageDoorWidthFt', label: 'Garage door, width', name: 'Garage door', unit: 'ft', min: 6, max: 30, step: 1, start: 16, unsure: sizeUnsure }),
      ],
    },
    {
      id: 'panel-place', title: 'Where on the wall is the panel?', short: 'panel', drawing: 'plan', when: panelInGarage,
      fields: [
        choice({ id: 'panelWall', label: 'The panel is on the', name: 'Panel wall', columns: 2, choices: wallChoices, unsure: { label: 'Not sure', note: 'Fine. We allow for any wall.' } }),
        number({ id: 'panelAlongFt', label: 'How far along that wall', name: 'Panel along the wall', hint: 'From the left corner; on a side wall, from the back.', unit: 'ft', min: 0, max: 60, step: 0.5, start: 4, unsure: { label: 'Not sure', note: 'Fine. We allow for the whole wall.' } }),
        number({ id: 'panelTopIn', label: 'Top of the panel above the floor', name: 'Panel top', unit: 'in.', min: 36, max: 90, step: 1, start: 60, optional: true }),
      ],
    },
    {
      id: 'charger-place', title: 'Where should the charger hang?', short: 'charger', hint: 'Near the car’s charge port is good. Most hang at 45 in.', drawing: 'plan', when: garage,
      fields: [
        choice({ id: 'chargerWall', label: 'On the', name: 'Charger wall', columns: 2, choices: wallChoices, unsure: { label: 'Not sure', note: 'Fine. We take the wall nearest the charge port.' } }),
        number({ id: 'chargerAlongFt', label: 'How far along that wall', name: 'Charger along the wall', hint: 'From the left corner; on a side wall, from the back.', unit: 'ft', min: 0, max: 60, step: 0.5, start: 9, unsure: { label: 'Not sure', note: 'Fine. We allow for the whole wall.' } }),
        number({ id: 'chargerHeightIn', label: 'Height off the floor', name: 'Charger height', unit: 'in.', min: 18, max: 60, step: 1, start: 45, optional: true }),
      ],
    },
    {
      id: 'car-place', title: 'How does the car stand?', short: 'car', drawing: 'plan', when: garage,
      fields: [
        choice({ id: 'carParked', label: 'You park', name: 'Parked', columns: 2, choices: [{ value: 'nose_in', label: 'Nose in' }, { value: 'back_in', label: 'Back in' }], unsure: { label: 'Not sure', note: 'Fine. Nose in is usual.' } }),
        choice({ id: 'portCorner', label: 'The charge port is at the car’s', name: 'Charge port', columns: 2, hint: 'As the driver sits: left is the driver’s left.',
          choices: [{ value: 'front_left', label: 'Front left' }, { value: 'front_right', label: 'Front right' }, { value: 'rear_left', label: 'Rear left' }, { value: 'rear_right', label: 'Rear right' }],
          unsure: { label: 'Not sure', note: 'Fine. We check the reach when we know.' } }),
        number({ id: 'carCenterXFt', label: 'Middle of the car from the left wall', name: 'Car from the left wall', unit: 'ft', min: 3, max: 57, step: 0.5, start: 14, optional: true }),
      ],
    },
    {
      id: 'paces', title: 'Walk from the garage to the panel', short: 'steps', hint: 'Start at the garage’s door to the house; outdoors, where the charger goes. Count your steps along a way that a wire could go. One is about 2.5 ft.', when: panelBeyond,
      fields: [
        number({ id: 'pacesToPanel', label: 'Steps to the panel', name: 'Steps to the panel', unit: 'steps', min: 1, max: 80, step: 1, start: 12, unsure: { label: 'Not sure', note: 'Fine. A visit or a photo of the way will tell us.', photo: 'way' } }),
        choice({ id: 'floorsBetween', label: 'Floors in between', name: 'Floors between', columns: 3, choices: [{ value: '0', label: 'Same floor' }, { value: '1', label: 'One' }, { value: '2', label: 'Two' }], unsure: { label: 'Not sure', note: 'Fine. We allow for one.' } }),
      ],
    },
    {
      id: 'yard', title: 'What lies between house and garage?', short: 'yard', when: detached,
      fields: [
        number({ id: 'trenchFt', label: 'Distance across the yard', name: 'Across the yard', unit: 'ft', min: 1, max: 150, step: 1, start: 30, unsure: { label: 'Not sure', note: 'Fine. We measure it when we visit.' } }),
        choice({ id: 'surfaceOver', label: 'The ground there', name: 'Ground', columns: 3, choices: [{ value: 'soil', label: 'Soil or lawn' }, { value: 'gravel', label: 'Gravel' }, { value: 'paved', label: 'Paved' }], unsure: { label: 'Not sure', note: 'Fine. We look when we visit.' } }),
      ],
    },
    {
      id: 'finish', title: 'Walls, ways and looks', short: 'walls',
      fields: [
        choice({ id: 'wallFinish', label: 'The garage walls are mostly', name: 'Walls', columns: 3, when: garage, choices: [{ value: 'drywall', label: 'Drywall' }, { value: 'bare_studs', label: 'Bare studs' }, { value: 'masonry', label: 'Brick or block' }], unsure: { label: 'Not sure', note: 'Fine. A photo of the wall will tell us.', photo: 'wall' } }),
        choice({ id: 'atticAbove', label: 'Can someone get above the garage ceiling?', name: 'Attic above', columns: 2, when: garage, choices: yesNo, unsure: { label: 'Not sure', note: 'Fine. We allow for both.' } }),
        choice({ id: 'crawlBelow', label: 'Is there a crawl space or basement below the way?', name: 'Crawl space', columns: 2, when: panelBeyond, choices: yesNo, unsure: { label: 'Not sure', note: 'Fine. We allow for both.' } }),
        choice({ id: 'houseDoorWall', label: 'The door to the house is on the', name: 'House door wall', columns: 2, when: garage, choices: [...wallChoices.slice(0, 3), { value: 'none', label: 'There is none' }], unsure: { label: 'Not sure', note: 'Fine. We go round it when we see it.' } }),
        number({ id: 'houseDoorAlongFt', label: 'House door, how far along', name: 'House door along the wall', hint: 'To its near edge: from the left corner, or on a side wall from the back.', unit: 'ft', min: 0, max: 57, step: 0.5, start: 12, when: hasHouseDoor, optional: true }),
        choice({ id: 'runLook', label: 'Hidden in the wall, or a neat pipe on it?', name: 'Look', columns: 2, choices: [{ value: 'pipe', label: 'A neat pipe', note: 'Costs less' }, { value: 'hidden', label: 'Hidden', note: 'Where walls allow' }], unsure: { label: 'Either', note: 'Fine. We take what costs less.' } }),
        choice({ id: 'paintRun', label: 'Paint the pipe to match the wall?', name: 'Paint', columns: 2, when: (answers) => answers.runLook !== 'hidden', choices: yesNo, unsure: { label: 'Not sure', note: 'Fine. We allow for both.' } }),
      ],
    },
  ],
  check: (answers) => [
    ...(panelInGarage(answers) ? beyondWall(answers, 'panelWall', 'panelAlongFt') : []),
    ...(garage(answers) ? beyondWall(answers, 'chargerWall', 'chargerAlongFt') : []),
    ...(hasHouseDoor(answers) ? beyondWall(answers, 'houseDoorWall', 'houseDoorAlongFt', 3) : []),
    ...((numberAnswer(answers, 'garageDoorWidthFt') ?? 0) > (numberAnswer(answers, 'roomWidthFt') ?? Infinity)
      ? [{ field: 'garageDoorWidthFt', detail: 'The garage door is wider than the garage. Check both.' }]
      : []),
    ...(chargerOnDoor(answers) ? [{ field: 'chargerAlongFt', detail: 'A charger cannot hang on the garage door. Move it to the side.' }] : []),
  ],
  summary: (answers) => {
    const [width, depth] = [numberAnswer(answers, 'roomWidthFt'), numberAnswer(answers, 'roomDepthFt')];
    if (outdoors(answers)) return wordAnswer(answers, 'parking') === 'carport' ? 'Carport' : 'Driveway';
    return width && depth ? `${width} by ${depth} ft` : 'Not measured';
  },
};

/** True when the charger's place on the front wall is on the garage door, which stands in the middle of that wall. */
function chargerOnDoor(answers: Answers): boolean {
  const [along, width, door] = ['chargerAlongFt', 'roomWidthFt', 'garageDoorWidthFt'].map((id) => numberAnswer(answers, id));
  if (answers.chargerWall !== 'front' || along == null || width == null || door == null) return false;
  const left = (width - door) / 2;
  return along > left && along < left + door;
}
