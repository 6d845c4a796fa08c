import type { Awg, Material } from './awg';
import type { TradeSize } from './conduit-fill';
import type { CodeEdition } from './edition';
import type { TraceEntry } from './trace';

export type WiringMethod = 'EMT' | 'PVC40' | 'PVC80' | 'NM_B';

export interface CircuitInput {
  readonly edition: CodeEdition;
  readonly chargingAmps: number;
  readonly volts: 240 | 208;
  readonly connection: 'wired' | 'plug_in';
  /** Where the charger or its receptacle is. */
  readonly place: 'indoor' | 'outdoor';
  readonly method: WiringMethod;
  readonly material: Material;
  readonly oneWayFt: number;
  /** Air around the hottest part of the run. */
  readonly ambientC: number;
  /** In the same raceway or bundle; this circuit's two when left out. */
  readonly currentCarryingConductors?: number;
  /** Marking of the terminals; 75 for a wired charger, 60 for a receptacle when left out. */
  readonly terminalC?: 60 | 75;
  /** Part of the run is wet: outdoors or underground. As `place` when left out. */
  readonly wetLocation?: boolean;
  /** Take the size that `suggestedAwgForDrop` would offer. */
  readonly upsizeForDrop?: boolean;
}

export interface CircuitDesign {
  readonly edition: CodeEdition;
  readonly chargingAmps: number;
  readonly volts: 240 | 208;
  /** 125 % of the charging current, before the next standard rating. */
  readonly minimumDeviceAmps: number;
  readonly breakerAmps: number;
  readonly hotAwg: Awg;
  /** Copper, also with aluminum hots; with NM-B what the code asks, which the cable's own ground meets. */
  readonly groundAwg: Awg;
  readonly material: Material;
  readonly insulation: 'THHN' | 'THWN-2' | 'NM-B';
  readonly method: WiringMethod;
  readonly racewayTradeSize: TradeSize | null;
  readonly fillPercent: number | null;
  readonly voltageDropV: number;
  readonly voltageDropPercent: number;
  /** A thicker size that brings the drop to 3 %; null when it is within that already or no made size helps. */
  readonly suggestedAwgForDrop: Awg | null;
  readonly upsizedForDrop: boolean;
  readonly disconnectRequired: boolean;
  readonly gfciRequired: boolean;
  readonly gfciReason: string;
  readonly kw: number;
  readonly trace: readonly TraceEntry[];
}
