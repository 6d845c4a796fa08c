import type { Logic, Rule, RuleKind } from '../schema';

const read = (name: string): Logic => ({ var: name });
const equals = (name: string, value: Logic): Logic => ({ '===': [read(name), value] });

const bookSource = 'price book, invented for the demo';
const hoursSource = 'hours common practice, no source; rate invented for the demo';

type Words = Pick<Rule, 'words' | 'deskWords'>;
const rule = (
  id: string,
  line: string,
  kind: RuleKind,
  price: Rule['price'],
  source: string,
  { words, deskWords }: Words,
  when: Logic = true,
): Rule => ({ id, line, kind, when, price, words, deskWords, source });

/** Everything of the takeoff whose key starts with `items`. */
const taken = (id: string, line: string, items: string, words: Words) =>
  rule(id, line, 'material', { by: 'takeoff', items }, bookSource, words);
/** Every task of the takeoff whose key starts with `tasks`. */
const worked = (id: string, line: string, tasks: string, words: Words) =>
  rule(id, line, 'labor', { by: 'takeoff-tasks', tasks }, hoursSource, words);
const item = (id: string, line: string, key: Logic, quantity: Logic, words: Words, when?: Logic) =>
  rule(id, line, 'material', { by: 'item', item: key, quantity }, bookSource, words, when);
const task = (id: string, line: string, key: Logic, quantity: Logic, words: Words, when?: Logic) =>
  rule(id, line, 'labor', { by: 'task', task: key, quantity }, hoursSource, words, when);

const spaceIs = (fix: string) => equals('panel.spaceFix', fix);
const capacityIs = (fix: string) => equals('panel.capacityFix', fix);

/** The rules of edition 1. Takeoff gives quantities of the run and circuit; the rest is asked for by name. */
export const rules: Rule[] = [
  task('visit', 'visit', 'visit', 1, { words: 'Arrive, set up and clean up', deskWords: 'One visit' }),
  rule('load-check', 'visit', 'fee', { by: 'cents', cents: 5_500, quantity: 1, unit: 'each' }, 'invented for the demo', {
    words: 'Layout and load check',
    deskWords: 'Load calculation checked on site',
  }),

  taken('breaker', 'panel', 'breaker.', { words: 'The breaker', deskWords: 'Two-pole device; GFCI where the code asks' }),
  worked('tie-in', 'panel', 'panel_tie_in', { words: 'Connect in the panel', deskWords: 'Tie-in, torque, directory' }),

  item(
    'tandem',
    'panel_change',
    'panel.tandem',
    2,
    { words: 'Two slim breakers', deskWords: 'Tandems where the label permits' },
    spaceIs('tandem'),
  ),
  task(
    'tandem-work',
    'panel_change',
    'tandem',
    1,
    { words: 'Swap in the slim breakers', deskWords: 'Move two circuits' },
    spaceIs('tandem'),
  ),
  item(
    'sub-panel',
    'panel_change',
    'panel.sub_panel',
    1,
    { words: 'A small sub-panel', deskWords: 'Sub-panel beside the panel, moved circuits' },
    spaceIs('sub_panel'),
  ),
  task(
    'sub-panel-work',
    'panel_change',
    'sub_panel',
    1,
    { words: 'Fit the sub-panel', deskWords: 'Sub-panel 60 to 125 A' },
    spaceIs('sub_panel'),
  ),
  item(
    'load-manager',
    'panel_change',
    'panel.load_manager',
    1,
    { words: 'A load manager', deskWords: 'EMS, 625.42 and 750.30' },
    capacityIs('energy_management'),
  ),
  task(
    'load-manager-work',
    'panel_change',
    'energy_management',
    1,
    { words: 'Fit the load manager', deskWords: 'EMS and sensors' },
    capacityIs('energy_management'),
  ),
  item(
    'service',
    'panel_change',
    { cat: ['panel.service_', read('facts.serviceDrop')] },
    1,
    { words: 'Parts of a larger service', deskWords: 'Service kit, drop by kind' },
    capacityIs('service_upgrade'),
  ),
  task(
    'service-work',
    'panel_change',
    'service_upgrade',
    1,
    { words: 'Upgrade the service', deskWords: 'Service upgrade with the utility' },
    capacityIs('service_upgrade'),
  ),
  rule(
    'service-permit',
    'panel_change',
    'fee',
    { by: 'cents', cents: 18_000, quantity: 1, unit: 'each' },
    'invented for the demo',
    { words: 'Service permit', deskWords: 'Second permit for the service' },
    capacityIs('service_upgrade'),
  ),
  task(
    'flush-panel',
    'walls',
    'patch',
    1,
    { words: 'Open and close the wall by the panel', deskWords: 'Flush panel: open below or above it' },
    {
      and: [
        equals('facts.panelMount', 'flush'),
        { '!==': [read('facts.panelPlace'), 'outside'] },
        // The garage's studs say nothing of a panel elsewhere in the house.
        { or: [{ '!==': [read('facts.panelPlace'), 'garage_wall'] }, { '!==': [read('facts.wallFinish'), 'bare_studs'] }] },
      ],
    },
  ),

  ...['wire.', 'cable.', 'emt.', 'pvc40.', 'pvc80.', 'strap.', 'fitting.', 'box.', 'bushing.'].map((prefix) =>
    taken(`run-${prefix.slice(0, -1)}`, 'run', prefix, { words: 'Wire, pipe and fittings', deskWords: `Takeoff ${prefix}*` }),
  ),
  ...['emt', 'pvc', 'bend', 'pull', 'nm_', 'trench'].map((prefix) =>
    worked(`run-work-${prefix.replace('_', '')}`, 'run', prefix, { words: 'Put up the run', deskWords: `Takeoff hours ${prefix}` }),
  ),

  worked('penetration', 'walls', 'wall_penetration', { words: 'Through a framed wall', deskWords: 'Wood frame' }),
  worked('core', 'walls', 'masonry_core', { words: 'Through brick or block', deskWords: 'Masonry core to 8 in.' }),
  taken('seal', 'walls', 'seal.', { words: 'Seal the hole', deskWords: 'Fire and weather seal' }),
  worked('patch', 'walls', 'patch', { words: 'Open and close drywall', deskWords: 'Patches of a hidden run' }),
  taken('patch-kit', 'walls', 'patch.', { words: 'Drywall and compound', deskWords: 'Patch material' }),

  taken('paint', 'paint', 'paint.', { words: 'Paint', deskWords: 'Paint to match' }),
  worked('paint-work', 'paint', 'paint', { words: 'Paint the pipe', deskWords: 'Painting hours' }),

  rule('charger', 'charger', 'charger', { by: 'takeoff', items: 'charger.' }, bookSource, {
    words: 'The charger',
    deskWords: '48 A unit, adjustable',
  }),

  taken('outlet', 'outlet', 'receptacle.', { words: 'The outlet', deskWords: 'EV-grade 14-50' }),
  worked('outlet-work', 'outlet', 'receptacle', { words: 'Mount the outlet', deskWords: 'Receptacle and box' }),

  taken('mounting', 'mount', 'mounting.', { words: 'Mounting board and screws', deskWords: 'Mounting' }),
  worked('mount-work', 'mount', 'mount_charger', { words: 'Mount and connect', deskWords: 'Mount, terminate, configure' }),
  task(
    'plug-in-mount',
    'mount',
    'mount_charger',
    0.5,
    { words: 'Hang and set the charger', deskWords: 'Plug-in unit on its bracket, half the usual time' },
    { and: [read('option.plugIn'), { '>': [read('option.chargersSupplied'), 0] }] },
  ),
  task(
    'second-mount',
    'mount',
    'mount_charger',
    { '-': [read('option.chargers'), 1] },
    { words: 'Mount the second charger', deskWords: 'Second unit on the shared circuit, 625.42' },
    { '>': [read('option.chargers'), 1] },
  ),
  item(
    'second-circuit',
    'mount',
    'sharing.kit',
    1,
    { words: 'Link between the two chargers', deskWords: 'Tap box, whip and data cable to the second unit' },
    { '>': [read('option.chargers'), 1] },
  ),
  taken('disconnect', 'mount', 'disconnect.', { words: 'A switch by the charger', deskWords: '625.43' }),
  worked('disconnect-work', 'mount', 'disconnect', { words: 'Mount the switch', deskWords: 'Disconnect' }),
  worked('commissioning', 'mount', 'commissioning', { words: 'Test and walk through', deskWords: 'Commissioning' }),

  rule(
    'permit-fee',
    'permit',
    'fee',
    { by: 'cents', cents: read('place.permitCents'), quantity: 1, unit: 'each' },
    'jurisdiction table, invented for the demo',
    { words: 'The permit office’s fee', deskWords: 'Permit fee' },
  ),
  task('permit-paperwork', 'permit', 'permit_paperwork', 0.5, {
    words: 'Paperwork',
    deskWords: 'Half of the usual hour: forms come filled in',
  }),
  task(
    'inspection',
    'permit',
    'meet_inspector',
    { '*': [0.5, read('place.inspectionVisits')] },
    { words: 'Meet the inspector', deskWords: 'Half an hour each: visits are grouped' },
  ),

  rule(
    'load-report',
    'load_report',
    'fee',
    { by: 'cents', cents: 6_500, quantity: 1, unit: 'each' },
    'house rule, invented for the demo',
    { words: 'Written load calculation', deskWords: 'Home and charger over 90 % of the service' },
    { and: [{ '>': [read('load.share'), 0.9] }, capacityIs('none')] },
  ),

  taken('labels', 'labels', 'label.', { words: 'Labels and directory card', deskWords: 'Label set' }),
];
