import type { Labor } from '../schema';

/**
 * Hours by task, one electrician, handling included. `low` and `high` tell the owner how far jobs stray; prices use `typical`.
 * Source: hours common practice, no source; rate invented for the demo, inside the common 85 to 175 dollars an hour.
 */
export const labor: Labor = {
  rateCents: 11_000,
  tasks: {
    visit: { words: 'Arrive, set up, clean up', unit: 'visit', low: 0.5, typical: 1, high: 1.5 },
    panel_tie_in: { words: 'Connect in the panel, torque, directory', unit: 'each', low: 0.75, typical: 1, high: 2 },
    emt: { words: 'Put up EMT', unit: '10 ft', low: 0.5, typical: 0.7, high: 1.1 },
    pvc: { words: 'Put up PVC pipe', unit: '10 ft', low: 0.4, typical: 0.6, high: 0.9 },
    bend: { words: 'Bend, offset, elbow or box', unit: 'each', low: 0.15, typical: 0.25, high: 0.4 },
    pull: { words: 'Pull the wires', unit: '10 ft', low: 0.08, typical: 0.12, high: 0.2 },
    nm_open: { words: 'Run cable on open framing', unit: '10 ft', low: 0.2, typical: 0.35, high: 0.6 },
    nm_attic: { words: 'Run cable through attic or crawl space', unit: '10 ft', low: 0.4, typical: 0.7, high: 1.2 },
    nm_fished: { words: 'Fish cable through finished wall', unit: '10 ft', low: 0.8, typical: 1.4, high: 2.5 },
    patch: { words: 'Open and close drywall', unit: 'each', low: 0.75, typical: 1.5, high: 2.5 },
    wall_penetration: { words: 'Go through a framed wall', unit: 'each', low: 0.25, typical: 0.4, high: 0.75 },
    masonry_core: { words: 'Drill through brick or block', unit: 'each', low: 0.75, typical: 1.25, high: 2 },
    trench: { words: 'Dig and fill by hand', unit: 'ft', low: 0.12, typical: 0.25, high: 0.5 },
    paint: { words: 'Paint the pipe to match', unit: '10 ft', low: 0.1, typical: 0.2, high: 0.35 },
    mount_charger: { words: 'Mount, connect and set the charger', unit: 'each', low: 0.75, typical: 1.25, high: 2 },
    receptacle: { words: 'Mount the outlet and its box', unit: 'each', low: 0.5, typical: 0.75, high: 1.25 },
    disconnect: { words: 'Mount the disconnect', unit: 'each', low: 0.5, typical: 1, high: 1.5 },
    energy_management: { words: 'Fit the load manager and its sensors', unit: 'each', low: 1.5, typical: 2.5, high: 4 },
    tandem: { words: 'Swap two breakers for slim ones', unit: 'each', low: 0.4, typical: 0.6, high: 1 },
    sub_panel: { words: 'Fit a small sub-panel', unit: 'each', low: 3, typical: 4.5, high: 7 },
    service_upgrade: { words: 'Upgrade the service, with the utility', unit: 'each', low: 12, typical: 18, high: 28 },
    commissioning: { words: 'Test, measure, walk through it with you', unit: 'each', low: 0.3, typical: 0.5, high: 1 },
    permit_paperwork: { words: 'Permit paperwork', unit: 'each', low: 0.5, typical: 1, high: 2 },
    meet_inspector: { words: 'Meet the inspector', unit: 'visit', low: 0.5, typical: 1, high: 2 },
  },
};
