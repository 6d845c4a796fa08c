import { factsSchema } from '../../shared/facts';
import { answersPatchSchema } from '../../shared/api/intakes';
import { answersToFacts, fieldsById, firstOpenStep, stepById, stepDone, stepProblems, steps, UNSURE, visibleGroups, type Answers, type Step } from '../../shared/wizard/index';
import { factsInWords } from '../../shared/wizard/facts-in-words';

const step = (id: string): Step => {
  const found = stepById(id);
  if (!found) throw new Error(`no step ${id}`);
  return found;
};

/** An attached garage with the panel in it; invented. */
const answers: Answers = {
  zip: '00017', homeKind: 'house', tenure: 'own', parking: 'attached_garage', yearBuilt: '1990_2009', floorAreaFt2: 2100,
  carMaxAmps: '48', whPerMile: '300', milesPerDay: 40, hoursHome: 10, secondCar: 'no', chargerSupply: 'ours',
  mainBreakerAmps: '200', blankSpaces: '2', panelCondition: [], panelPlace: 'garage_wall', panelMount: 'flush', serviceDrop: 'overhead', solarAmps: '0',
  loads: { range: { present: true, amount: null }, dryer: { present: null, amount: null } },
  roomWidthFt: 20, roomDepthFt: 22, ceilingFt: 8.5, garageDoorWidthFt: 16, panelWall: 'back', panelAlongFt: 4.5, chargerWall: 'right', chargerAlongFt: 9,
  carParked: 'nose_in', portCorner: 'rear_right', wallFinish: 'drywall', atticAbove: 'no', houseDoorWall: 'left', houseDoorAlongFt: 12, runLook: 'pipe', paintRun: 'yes',
};

describe('the wizard', () => {
  it('has the seven steps of the product in order, and no field twice', () => {
    expect(steps.map((entry) => entry.short)).toEqual(['Home', 'Car', 'Panel', 'Big loads', 'Garage', 'Photos', 'Price']);
    const ids = steps.flatMap((entry) => entry.groups.flatMap((group) => group.fields.map((field) => field.id)));
    expect(new Set(ids).size).toBe(ids.length);
  });

  it('takes "Not sure" for every question that is not the home itself or a taste', () => {
    const never = ['zip', 'homeKind', 'tenure', 'parking', 'chargerSupply', 'loads'];
    const without = [...fieldsById.values()].filter((field) => !field.unsure && !field.optional).map((field) => field.id);
    expect(without.sort()).toEqual([...never].sort());
    for (const field of fieldsById.values()) expect(field.schema.safeParse(UNSURE).success).toBe(field.unsure !== undefined);
  });

  it('is done when every question that applies is answered, and never holds anyone up at the photos', () => {
    for (const entry of steps.slice(0, 5)) expect([entry.id, stepProblems(entry, answers)]).toEqual([entry.id, []]);
    expect(firstOpenStep(answers).id).toBe('price');
    expect(firstOpenStep({}).id).toBe('home');
    const { loads: _, ...withoutLoads } = answers;
    expect(stepDone(step('loads'), withoutLoads)).toBe(false);
  });

  it('asks for paces only when the panel is not on a garage wall', () => {
    expect(visibleGroups(step('garage'), answers).map((group) => group.id)).toEqual(['size', 'panel-place', 'charger-place', 'car-place', 'finish']);
    expect(visibleGroups(step('garage'), { ...answers, panelPlace: 'basement' }).map((group) => group.id)).toContain('paces');
    expect(visibleGroups(step('garage'), { ...answers, parking: 'driveway', panelPlace: 'outside' }).map((group) => group.id)).toEqual(['paces', 'finish']);
  });

  it('says beside the field what is impossible', () => {
    const problems = (change: Answers) => stepProblems(step('garage'), { ...answers, ...change });
    expect(problems({ chargerAlongFt: 40 })).toEqual([{ field: 'chargerAlongFt', detail: 'That wall is 22 ft long. Pick a smaller distance.' }]);
    expect(problems({ garageDoorWidthFt: 24 })[0]?.field).toBe('garageDoorWidthFt');
    expect(problems({ chargerWall: 'front', chargerAlongFt: 10 })[0]?.detail).toMatch(/garage door/);
    expect(problems({ roomWidthFt: 500 })[0]?.detail).toBe('60 ft at most');
    expect(stepProblems(step('home'), { ...answers, zip: '17' })[0]?.detail).toMatch(/five digits/);
    expect(stepProblems(step('car'), { ...answers, chargerSupply: 'theirs', chargerMaxAmps: '48', chargerConnection: 'plug_in', cableLengthFt: 20 })[0]?.field).toBe('chargerConnection');
  });

  it('remarks calmly on a car that takes more than the charger gives', () => {
    const field = fieldsById.get('carMaxAmps');
    expect(field?.remark?.({ ...answers, carMaxAmps: '80', chargerSupply: 'theirs', chargerMaxAmps: '40' })).toMatch(/40 A at most/);
    expect(field?.remark?.(answers)).toBeNull();
  });
});

describe('answers to facts', () => {
  it('gives facts within their schema, places on walls only when wall and distance are known', () => {
    const facts = answersToFacts(answers);
    expect(factsSchema.safeParse(facts).error).toBeUndefined();
    expect(facts.panelAt).toEqual({ wall: 'back', alongFt: 4.5, topIn: 60 });
    expect(facts.garageDoor).toEqual({ alongFt: 2, widthFt: 16 });
    expect(facts.solarAmps).toBe(0);
    expect(answersToFacts({ ...answers, panelAlongFt: UNSURE }).panelAt).toBeNull();
  });
  it('makes null of "Not sure" and of what was never asked', () => {
    const facts = answersToFacts({ ...answers, mainBreakerAmps: UNSURE, panelCondition: UNSURE });
    expect([facts.mainBreakerAmps, facts.panelCondition, facts.chargerMaxAmps, facts.loads.dryer?.present, facts.loads.spa?.present]).toEqual([null, null, null, null, null]);
    expect(factsSchema.safeParse(answersToFacts({})).success).toBe(true);
  });
  it('keeps no room for a car that stands outdoors', () => {
    expect(answersToFacts({ ...answers, parking: 'driveway' })).toMatchObject({ room: null, panelAt: null, chargerAt: null, wallFinish: null });
  });
  it('says every fact in words with its source', () => {
    const words = Object.fromEntries(factsInWords(answersToFacts(answers), { mainBreakerAmps: 'estimator' }).map((fact) => [fact.name, `${fact.words} / ${fact.source}`]));
    expect(words.mainBreakerAmps).toBe('200\u00a0A / estimator');
    expect(words.panelAt).toBe('back wall, 4\u00a0ft 6\u00a0in. from the left corner / homeowner');
    expect(words['loads.dryer']).toBe('Not sure / assumed');
    expect(words.trenchFt).toBeUndefined();
  });
});

describe('a patch of answers', () => {
  const pointers = (body: unknown) => (answersPatchSchema.safeParse(body).error?.issues ?? []).map((issue) => `/${issue.path.join('/')}`);
  it('is checked field by field, with a pointer to each that is wrong', () => {
    expect(pointers({ answers: { zip: '00017', floorAreaFt2: null } })).toEqual([]);
    expect(pointers({ answers: { zip: 'x', roomWidthFt: 500, nothing: 1 } })).toEqual(['/answers/zip', '/answers/roomWidthFt', '/answers/nothing']);
    expect(pointers({ answers: { loads: { spa: { present: true, amount: 5 } } } })).toEqual(['/answers/loads/spa/amount']);
    expect(pointers({ answers: { loads: { laser: { present: true, amount: null } } } })).not.toEqual([]);
    expect(pointers({ answers: {} })).toEqual(['/answers']);
  });
});
