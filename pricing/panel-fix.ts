import { panelChangeWords } from '../shared/quote';
import type { Home } from './home';
import type { RuleContext } from './rulebook/names';

export type CapacityFix = 'none' | 'energy_management' | 'service_upgrade';
export type SpaceFix = 'none' | 'tandem' | 'sub_panel';

/**
 * Ways to make the service carry the setting: none needed; else a larger service, or energy management where the home alone keeps
 * within the service: then the manager holds the charger back and the service never sees more. NEC 2023 220.70, 625.42(A), 750.30.
 */
export function capacityFixes({ verdict, serviceAmps, homeAmps }: Home, chargingAmps: number): readonly CapacityFix[] {
  if (chargingAmps <= verdict.maxChargingAmps) return NO_FIX;
  return homeAmps <= serviceAmps ? MANAGED_OR_UPGRADED : UPGRADED;
}
const NO_FIX: readonly CapacityFix[] = ['none'];
const MANAGED_OR_UPGRADED: readonly CapacityFix[] = ['energy_management', 'service_upgrade'];
const UPGRADED: readonly CapacityFix[] = ['service_upgrade'];

/**
 * Two blank spaces side by side take the breaker; one and a slim pair make two; none asks for a sub-panel. A new service brings its own.
 */
export function spaceFixOf(blankSpaces: 0 | 1 | 2, capacityFix: CapacityFix): SpaceFix {
  if (capacityFix === 'service_upgrade' || blankSpaces === 2) return 'none';
  return blankSpaces === 1 ? 'tandem' : 'sub_panel';
}

const panels = new Map<string, RuleContext['panel']>();
/** The panel as rules read it, with its change in words. */
export function panelFor(capacityFix: CapacityFix, spaceFix: SpaceFix): RuleContext['panel'] {
  const key = capacityFix + spaceFix;
  let panel = panels.get(key);
  if (!panel) {
    const changeWords = [capacityFix, spaceFix]
      .filter((fix) => fix !== 'none')
      .map((fix) => panelChangeWords[fix])
      .join('; ');
    panels.set(key, (panel = { spaceFix, capacityFix, changeWords }));
  }
  return panel;
}
