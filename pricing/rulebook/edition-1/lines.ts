import type { LineRule } from '../schema';

/** The lines of a price, in the order in which a homeowner reads them. */
export const lines: LineRule[] = [
  {
    id: 'visit',
    title: 'Visit, layout, load check',
    note: '',
    why: 'We come, lay out the run with you, check the load on site, and clean up after.',
  },
  {
    id: 'panel',
    title: '{option.breakerAmps|amps} breaker, panel work',
    note: '{facts.mainBreakerAmps|amps} main',
    why: 'A new breaker of the right size, tightened to the maker’s value.',
  },
  {
    id: 'panel_change',
    title: 'Room and capacity in the panel',
    note: '{panel.changeWords}',
    why: 'The circuit needs two spaces and enough left of the service.',
  },
  {
    id: 'run',
    title: '{run.method|wiring}, {run.lengthFt|feet}',
    note: '{circuit.words}',
    why: 'The way from the panel to the charger with its ups and downs. Spare wire at both ends is in it.',
  },
  {
    id: 'walls',
    title: 'Wall pass-through',
    note: '{run.methodWords}',
    why: 'Each wall the wire goes through, or is hidden in, is opened and closed neatly.',
  },
  { id: 'paint', title: 'Paint to match', note: 'The pipe, in your wall’s color', why: 'You asked for the pipe to match the wall.' },
  { id: 'charger', title: '{option.chargersSupplied|chargers}', note: 'Up to 48 A, 18 ft cable', why: 'We bring it, and it is under our warranty.' },
  {
    id: 'outlet',
    title: 'Outlet and box',
    note: 'For a charger with a plug',
    why: 'A heavy-duty outlet made for cars, in a box that is grounded and covered.',
  },
  {
    id: 'mount',
    title: 'Mount, connect, test',
    note: '{option.chargingAmps|amps} charging',
    why: 'What hangs at the end of the wire is fitted to its circuit, tested under load, and shown to you.',
  },
  {
    id: 'permit',
    title: 'Permit and inspection',
    note: '{place.name}',
    why: 'The permit office’s fee, the paperwork, and meeting the inspector.',
  },
  {
    id: 'load_report',
    title: 'Written load report',
    note: 'Close to the limit of a {load.serviceAmps|amps} service',
    why: 'Close to the limit of the service, the permit office wants the calculation in writing.',
  },
  { id: 'tax', title: 'Sales tax', note: 'On {option.chargersSupplied|taxed}', why: 'We pass it on to the state.' },
  {
    id: 'labels',
    title: 'Labels and directory card',
    note: '',
    why: 'So that the next person knows what each breaker feeds.',
    included: true,
  },
  { id: 'minimum', title: 'Smallest job', note: '', why: 'Below this we cannot send a crew and a permit.' },
];
