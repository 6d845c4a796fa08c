import { designCircuit, type CircuitInput } from '../../../pricing/electrical/circuit';
import { ElectricalError } from '../../../pricing/electrical/edition';
import { gfciDecision } from '../../../pricing/electrical/gfci';

const plain: CircuitInput = {
  edition: '2023', chargingAmps: 48, volts: 240, connection: 'wired', place: 'indoor', method: 'EMT', material: 'Cu', oneWayFt: 32,
  ambientC: 30,
};
const design = (change: Partial<CircuitInput>) => designCircuit({ ...plain, ...change });

describe('circuit table of charging circuits: 125 % (NEC 2023 625.41), Table 310.16, Table 250.122, 625.43', () => {
  it.each([
    [16, 3.84, 3.33, 20, '12', '12', '12', false], [24, 5.76, 4.99, 30, '10', '10', '10', false], [32, 7.68, 6.66, 40, '8', '8', '10',
    false],
    [40, 9.6, 8.32, 50, '6', '8', '10', false], [48, 11.52, 9.98, 60, '4', '6', '10', false], [64, 15.36, 13.31, 80, '2', '4', '8', true],
  ] as const)('%i A: %f kW, at 208 V %f kW, device %i A, NM-B %s, THHN %s, ground %s, disconnect %s',
    (chargingAmps, kw, kwAt208, breakerAmps, nmAwg, thhnAwg, groundAwg, disconnect) => {
      const emt = design({ chargingAmps });
      expect(emt).toMatchObject({ breakerAmps, hotAwg: thhnAwg, groundAwg, disconnectRequired: disconnect, insulation: 'THHN' });
      expect(emt.kw).toBeCloseTo(kw, 6);
      expect(design({ chargingAmps, volts: 208 }).kw).toBeCloseTo(kwAt208, 2);
      expect(design({ chargingAmps, method: 'NM_B' })).toMatchObject({ hotAwg: nmAwg, insulation: 'NM-B', racewayTradeSize: null,
        fillPercent: null });
    });

  it('80 A: 3 AWG THHN, 100 A device, 8 AWG ground, 1 in. EMT; not possible with NM-B, which ends at 2 AWG, 95 A', () => {
    expect(design({ chargingAmps: 80 })).toMatchObject({ breakerAmps: 100, hotAwg: '3', groundAwg: '8', racewayTradeSize: '1',
      disconnectRequired: true });
    expect(() => design({ chargingAmps: 80, method: 'NM_B' })).toThrow('80 A of charging is more than NM-B cable may carry');
  });

  it.each([[24, '8'], [32, '8'], [40, '6'], [48, '4'], [64, '2'], [80, '1']] as const)('aluminum, %i A: %s AWG with a copper ground',
    (chargingAmps, hotAwg) => {
    expect(design({ chargingAmps, material: 'Al' }).hotAwg).toBe(hotAwg);
  });

  it('a 44 A setting: 55 A least, 60 A breaker, and 6 AWG NM-B of 55 A is enough with the next rating up, 240.4(B)', () => {
    expect(design({ chargingAmps: 44, method: 'NM_B' })).toMatchObject({ minimumDeviceAmps: 55, breakerAmps: 60, hotAwg: '6' });
  });
});

describe('place and terminals', () => {
  it('110.14(C)(1): a receptacle is taken as 60 C, so 40 A by plug wants 6 AWG where a wired charger has 8', () => {
    expect(design({ chargingAmps: 40, connection: 'plug_in' }).hotAwg).toBe('6');
    expect(design({ chargingAmps: 40, connection: 'plug_in', terminalC: 75 }).hotAwg).toBe('8');
    expect(design({ chargingAmps: 40, terminalC: 60 }).hotAwg).toBe('6');
  });

  it('334.80: in an attic of 54 C, NM-B 4 AWG for 48 A is still 70 A: 95 x 0.76 = 72.2, capped at 70', () => {
    expect(design({ method: 'NM_B', ambientC: 54 }).hotAwg).toBe('4');
  });

  it('310.15(B)(1): at 66 C 6 AWG NM-B has 75 x 0.58 = 43.5 A and its breaker may be 45 A, so 40 A on 50 A wants 4 AWG', () => {
    expect(design({ chargingAmps: 40, method: 'NM_B', ambientC: 66 }).hotAwg).toBe('4');
    expect(design({ chargingAmps: 40, method: 'NM_B', ambientC: 60 }).hotAwg).toBe('6');
  });

  it('310.15(C)(1): four conductors keep 6 AWG for 48 A, 75 x 0.8 = 60 A; ten want 3, 115 x 0.5 = 57.5, as 4 has 47.5', () => {
    expect(design({ currentCarryingConductors: 4 }).hotAwg).toBe('6');
    expect(design({ currentCarryingConductors: 10 }).hotAwg).toBe('3');
  });

  it('240.4(B): nine conductors leave 6 AWG 75 x 0.7 = 52.5 A, which the next rating up, 60 A, still protects', () => {
    expect(design({ currentCarryingConductors: 9 }).hotAwg).toBe('6');
  });

  it('outdoors and underground the wire is wet-rated, and NM-B is refused, 334.12(B)(4) (from memory)', () => {
    expect(design({ place: 'outdoor', method: 'PVC40' }).insulation).toBe('THWN-2');
    expect(design({ wetLocation: true, method: 'PVC40' }).insulation).toBe('THWN-2');
    expect(design({ place: 'outdoor', wetLocation: false, method: 'NM_B' }).insulation).toBe('NM-B');
    expect(() => design({ place: 'outdoor', method: 'NM_B' })).toThrow('334.12(B)(4)');
  });

  it('a receptacle takes a neutral too: 3 x 6 and 10 AWG, 0.1732 sq in., 3/4 in. EMT but 1 in. PVC 80 (0.164)', () => {
    const plug = { chargingAmps: 40, connection: 'plug_in' } as const;
    expect(design(plug).racewayTradeSize).toBe('3/4');
    expect(design(plug).fillPercent).toBeCloseTo((100 * 0.1732) / 0.5333, 1);
    expect(design({ ...plug, method: 'PVC80' }).racewayTradeSize).toBe('1');
  });
});

describe('voltage drop is advice: NEC 2023 210.19(A), informational note', () => {
  it('40 A on 8 AWG over 150 ft loses 3.89 % (Table 8, from memory): nothing is upsized silently, 6 AWG is offered', () => {
    const circuit = design({ chargingAmps: 40, oneWayFt: 150 });
    expect(circuit).toMatchObject({ hotAwg: '8', groundAwg: '10', upsizedForDrop: false, suggestedAwgForDrop: '6' });
    expect(circuit.voltageDropPercent).toBeCloseTo(3.89, 2);
    expect(circuit.trace.some(({ value }) => value.includes('6 AWG would keep the drop'))).toBe(true);
  });

  it('taken when asked for, and the ground grows with it, 250.122(B): 10,380 x 26,240 / 16,510 = 16,497, 8 AWG', () => {
    const circuit = design({ chargingAmps: 40, oneWayFt: 150, upsizeForDrop: true });
    expect(circuit).toMatchObject({ hotAwg: '6', groundAwg: '8', upsizedForDrop: true });
    expect(circuit.voltageDropPercent).toBeLessThanOrEqual(3);
  });

  it('heat and company are part of the minimum and do not grow the ground, 250.122(B)', () => {
    expect(design({ currentCarryingConductors: 10 })).toMatchObject({ hotAwg: '3', groundAwg: '10' });
  });

  it('the ground in NM-B is fixed (cable make-up from memory): 32 A from 8 AWG offers none at 6, whose ground is 10, nor at 4', () => {
    const circuit = design({ chargingAmps: 32, method: 'NM_B', oneWayFt: 160, upsizeForDrop: true });
    expect(circuit.voltageDropPercent).toBeGreaterThan(3);
    expect(circuit).toMatchObject({ hotAwg: '8', suggestedAwgForDrop: null, upsizedForDrop: false });
  });

  it('40 A in NM-B goes from 6 to 4 AWG: 10,380 x 41,740 / 26,240 = 16,511, its 8 AWG ground is enough', () => {
    expect(design({ chargingAmps: 40, method: 'NM_B', oneWayFt: 200, upsizeForDrop: true })).toMatchObject({ hotAwg: '4', groundAwg: '8',
      upsizedForDrop: true });
  });

  it('within 3 % nothing is offered', () => expect(design({}).suggestedAwgForDrop).toBeNull());
});

describe('GFCI: NEC 2020 and 2023 625.54, 210.8(F)', () => {
  it.each([
    ['plug_in', 'indoor', 50, true], ['plug_in', 'outdoor', 50, true], ['wired', 'outdoor', 50, true], ['wired', 'outdoor', 60, false],
    ['wired', 'indoor', 50, false], ['wired', 'indoor', 60, false],
  ] as const)('%s, %s, %i A: %s', (connection, place, breakerAmps, required) => {
    for (const edition of ['2020', '2023'] as const) {
      const decision = gfciDecision({ edition, connection, place, breakerAmps, voltsToGround: 120 });
      expect(decision.required).toBe(required);
      expect(decision.clause).toBe(`NEC ${edition} ${connection === 'plug_in' ? '625.54' : '210.8(F)'}`);
      expect(decision.reason.length).toBeGreaterThan(20);
    }
  });
  it('2023 names garages at or below grade: the desk is told to ask; 2020 did not', () => {
    const wired = { connection: 'wired', place: 'indoor', breakerAmps: 50, voltsToGround: 120 } as const;
    expect(gfciDecision({ edition: '2023', ...wired }).reason).toContain('ask');
    expect(gfciDecision({ edition: '2020', ...wired }).reason).not.toContain('ask');
    expect(gfciDecision({ edition: '2023', ...wired, breakerAmps: 60 }).reason).not.toContain('ask');
  });
  it('above 150 V to ground the outdoor rule does not apply', () => {
    expect(gfciDecision({ edition: '2023', connection: 'wired', place: 'outdoor', breakerAmps: 50, voltsToGround: 277 }).required)
      .toBe(false);
  });
});

describe('what cannot be built is refused in words', () => {
  it.each([
    [{ chargingAmps: 48, connection: 'plug_in' }, '625.44'], [{ chargingAmps: 81 }, '6 to 80 A'], [{ chargingAmps: 5 }, '6 to 80 A'],
    [{ chargingAmps: NaN }, '6 to 80 A'], [{ oneWayFt: -1 }, 'length'], [{ oneWayFt: Infinity }, 'length'], [{ ambientC: NaN },
    'temperature'],
    [{ material: 'Al', method: 'NM_B' }, 'copper'], [{ ambientC: 80 }, 'may not be used'], [{ chargingAmps: 80,
    currentCarryingConductors: 41 }, 'thicker than'],
  ] as const)('%j: %s', (change, words) => {
    expect(() => design(change)).toThrow(ElectricalError);
    expect(() => design(change)).toThrow(words);
  });
});

it('the trace names every choice with clause and edition, is the same each time, and survives JSON', () => {
  const circuit = design({ edition: '2020' });
  expect(circuit.trace.every(({ clause }) => clause.startsWith('NEC 2020 '))).toBe(true);
  expect(circuit.trace.map(({ what }) => what))
    .toEqual(['Charging current', 'Least breaker', 'Breaker', 'Smallest wire', 'Correction', 'Voltage drop', 'Ground', 'Conduit',
      'Disconnect', 'GFCI breaker']);
  expect(JSON.stringify(circuit)).toBe(JSON.stringify(design({ edition: '2020' })));
  expect(JSON.parse(JSON.stringify(circuit))).toHaveProperty('trace.2.value', '60 A');
});
