import type { CircuitDesign } from '../electrical/circuit-types';

/** Key in the price book, and words on the pick list. */
export interface Name { readonly item: string; readonly words: string }

/** What the things of one circuit are called. */
export interface CircuitNames {
  /** Trade size of the pipe of a run: the circuit's, or of the pipe that protects its cable. */
  readonly pipeSize: string;
  readonly black: Name; readonly red: Name; readonly green: Name; readonly white: Name;
  /** With ground: two wires, or three for an outlet, which has a place for a neutral. */
  readonly cable: Name; readonly cableWithNeutral: Name;
  readonly pipe: Name; readonly coupling: Name; readonly connector: Name;
  readonly bushing: Name; readonly elbow: Name; readonly strap: Name;
  readonly breaker: Name;
}

const pipeWords = { emt: 'EMT', pvc40: 'PVC pipe, Schedule 40', pvc80: 'PVC pipe, Schedule 80' } as const;
const metals = { Cu: 'copper', Al: 'aluminum' } as const;

/**
 * Pipe that protects a cable of this size: its broad side counts as a round one and fills 53 % at most.
 * Source: NEC 2023 Chapter 9 Table 1 and note 9; cable widths from memory (8 AWG about 0.56 in., 6 AWG 0.7 in., 4 AWG 0.8 in.).
 */
export function sleeveSize(hotAwg: string): '3/4' | '1' | '1-1/4' {
  if (hotAwg === '14' || hotAwg === '12' || hotAwg === '10' || hotAwg === '8') return '3/4';
  return hotAwg === '6' ? '1' : '1-1/4';
}

/** Key of a pipe's material. A cable is protected by EMT. */
const pipeKey = (method: CircuitDesign['method']): keyof typeof pipeWords =>
  method === 'PVC40' ? 'pvc40' : method === 'PVC80' ? 'pvc80' : 'emt';

// Names cost more than the arithmetic, and homes share circuits.
const namesByCircuit = new WeakMap<CircuitDesign, CircuitNames>();

/** The names of a circuit's things; worked out once for each design. */
export function namesOf(circuit: CircuitDesign): CircuitNames {
  const known = namesByCircuit.get(circuit);
  if (known) return known;
  const names = nameAll(circuit);
  namesByCircuit.set(circuit, names);
  return names;
}

function nameAll(circuit: CircuitDesign): CircuitNames {
  const [hot, ground, metal] = [circuit.hotAwg, circuit.groundAwg, metals[circuit.material]];
  const size = circuit.method === 'NM_B' ? sleeveSize(hot) : (circuit.racewayTradeSize ?? '3/4');
  const key = pipeKey(circuit.method);
  const family = key === 'emt' ? 'emt' : 'pvc';
  const wire = (material: CircuitDesign['material'], awg: string, color: string): Name =>
    ({ item: `wire.thhn.${material.toLowerCase()}.${awg}`, words: `${awg} AWG ${metals[material]} ${circuit.insulation}, ${color}` });
  const hotWire = (color: string): Name => wire(circuit.material, hot, color);
  const cable = (wires: 2 | 3): Name => ({ item: `cable.nmb.${hot}-${wires}`, words: `${hot}-${wires} ${metal} NM-B cable with ground` });
  return {
    pipeSize: size, black: hotWire('black'), red: hotWire('red'), green: wire('Cu', ground, 'green'), white: hotWire('white'),
    cable: cable(2), cableWithNeutral: cable(3),
    pipe: { item: `${key}.${size}`, words: `${size} in. ${pipeWords[key]}` },
    coupling: { item: `fitting.${family}.coupling.${size}`, words: `${size} in. coupling` },
    connector: { item: `fitting.${family}.connector.${size}`, words: `${size} in. connector` },
    elbow: { item: `fitting.${family}.lb.${size}`, words: `${size} in. elbow with a cover (LB)` },
    strap: { item: `strap.${family}.${size}`, words: `${size} in. strap` },
    bushing: { item: `bushing.${size}`, words: `${size} in. bushing` },
    breaker: circuit.gfciRequired
      ? { item: `breaker.gfci.${circuit.breakerAmps}`, words: `${circuit.breakerAmps} A two-pole GFCI breaker` }
      : { item: `breaker.${circuit.breakerAmps}`, words: `${circuit.breakerAmps} A two-pole breaker` },
  };
}
