import { panelChangeWords } from '../shared/quote';
import { planEnergyManagement, type EnergyManagement } from './electrical/energy-management';
import type { Home } from './home';
import type { RuleContext } from './rulebook/names';
import { lowerFirst } from './words';

export type CapacityFix = 'none' | 'energy_management' | 'service_upgrade';
export type SpaceFix = 'none' | 'tandem' | 'sub_panel';

/** What a load manager would do in this home at a setting. NEC 625.42(A), 750.30; 220.70 (2023). */
export const managedCharging = ({ place, serviceAmps, homeAmps }: Home, chargingAmps: number): EnergyManagement =>
  planEnergyManagement({ edition: place.codeEdition, serviceAmps, homeAmps, chargingAmps });

/**
 * Ways to make the service carry the setting: none needed; else energy management where the home alone keeps within the service, or
 * the larger service of the rulebook where it is larger and carries home and charger.
 * @returns an empty list when none of them is enough.
 */
export function capacityFixes(home: Home, chargingAmps: number): readonly CapacityFix[] {
  if (chargingAmps <= home.maxChargingAmps) return NO_FIX;
  const upgraded = chargingAmps <= home.maxUpgradedAmps;
  if (managedCharging(home, chargingAmps).possible) return upgraded ? MANAGED_OR_UPGRADED : MANAGED;
  return upgraded ? UPGRADED : BEYOND;
}
const NO_FIX: readonly CapacityFix[] = ['none'];
const MANAGED_OR_UPGRADED: readonly CapacityFix[] = ['energy_management', 'service_upgrade'];
const MANAGED: readonly CapacityFix[] = ['energy_management'];
const UPGRADED: readonly CapacityFix[] = ['service_upgrade'];
const BEYOND: readonly CapacityFix[] = [];

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
      .map((fix, place) => (place === 0 ? panelChangeWords[fix] : lowerFirst(panelChangeWords[fix])))
      .join('; ');
    panels.set(key, (panel = { spaceFix, capacityFix, changeWords }));
  }
  return panel;
}
