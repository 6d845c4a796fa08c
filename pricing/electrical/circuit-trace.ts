import type { Awg } from './awg';
import type { CircuitDesign } from './circuit-types';
import { clause } from './edition';
import type { TraceEntry } from './trace';

export interface TracedChoices {
  readonly minimumAwg: Awg;
  readonly terminalC: 60 | 75;
  readonly ambientC: number;
  readonly currentCarryingConductors: number;
  readonly oneWayFt: number;
  readonly gfciClause: string;
}

/** How each figure of a circuit came to be, in the order of the design, each with its clause and edition. */
export function circuitTrace(design: Omit<CircuitDesign, 'trace'>, choices: TracedChoices): TraceEntry[] {
  const { edition, material, method, hotAwg, groundAwg } = design;
  const nec = (reference: string) => clause(edition, reference);
  const metal = material === 'Cu' ? 'copper' : 'aluminum';
  const nmCable = method === 'NM_B';
  const entries: TraceEntry[] = [
    { what: 'Charging current', value: `${design.chargingAmps} A at ${design.volts} V, ${design.kw.toFixed(2)} kW`, clause: nec('625.42') },
    { what: 'Least breaker', value: `${design.minimumDeviceAmps} A, 125 % of the charging current`, clause: nec('210.20(A), 625.41') },
    { what: 'Breaker', value: `${design.breakerAmps} A`, clause: nec('240.6(A)') },
    {
      what: 'Smallest wire',
      value: nmCable
        ? `${choices.minimumAwg} AWG ${metal}: NM-B by its 60 °C column`
        : `${choices.minimumAwg} AWG ${metal}: terminals ${choices.terminalC} °C, insulation 90 °C`,
      clause: nec(nmCable ? '210.19(A)(1), 310.16, 334.80' : '110.14(C), 210.19(A)(1), 310.16'),
    },
    {
      what: 'Correction',
      value: `${choices.ambientC} °C around it, ${choices.currentCarryingConductors} current-carrying conductors together`,
      clause: nec('310.15(B)(1), 310.15(C)(1)'),
    },
    {
      what: 'Voltage drop',
      value: `${design.voltageDropPercent.toFixed(1)} % with ${hotAwg} AWG over ${choices.oneWayFt} ft, there and back`,
      clause: nec('Chapter 9 Table 8; 210.19(A) advises 3 %'),
    },
  ];
  const advice = nec('210.19(A), advice');
  if (design.upsizedForDrop) entries.push({ what: 'Wire', value: `${hotAwg} AWG ${metal}, thicker for less voltage drop`, clause: advice });
  else if (design.suggestedAwgForDrop) {
    entries.push({ what: 'Offer', value: `${design.suggestedAwgForDrop} AWG would keep the drop within 3 %`, clause: advice });
  }
  entries.push({
    what: 'Ground', value: nmCable ? `${groundAwg} AWG copper or thicker, inside the cable` : `${groundAwg} AWG copper`,
    clause: nec(design.upsizedForDrop ? 'Table 250.122, 250.122(B)' : 'Table 250.122'),
  });
  if (design.racewayTradeSize !== null && design.fillPercent !== null) {
    entries.push({
      what: 'Conduit',
      value: `${design.racewayTradeSize} in., ${design.fillPercent.toFixed(0)} % full; 3/4 in. is the least that the trade runs`,
      clause: nec('Chapter 9 Tables 1, 4, 5'),
    });
  }
  entries.push(
    { what: 'Disconnect', value: design.disconnectRequired ? 'needed, above 60 A' : 'not needed to 60 A', clause: nec('625.43') },
    { what: 'GFCI breaker', value: `${design.gfciRequired ? 'needed' : 'not needed'}. ${design.gfciReason}`, clause: choices.gfciClause },
  );
  return entries;
}
