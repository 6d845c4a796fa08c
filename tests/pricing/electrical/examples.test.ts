import { allowedAreaIn2, conductorAreaIn2, smallestRaceway } from '../../../pricing/electrical/conduit-fill';
import { otherConnectedVa, type Hvac } from '../../../pricing/electrical/dwelling-loads';
import { chargingAmpsWithin } from '../../../pricing/electrical/energy-management';
import { load22082 } from '../../../pricing/electrical/load-220-82';
import { load22083A } from '../../../pricing/electrical/load-220-83';
import { fixedApplianceDemandVa, legAmps, lightingDemandVa, rangeDemandVa, standardLoad } from '../../../pricing/electrical/load-standard';

const noHvac: Hvac = { coolingVa: 0, heatPumpVa: 0, supplementalHeatVa: 0, centralHeatVa: 0, roomHeatersVa: 0, roomHeaterCount: 0 };
const connected = (floorAreaFt2: number, ...appliancesVa: number[]) => otherConnectedVa({
  floorAreaFt2, smallApplianceCircuits: 2, laundryCircuits: 1, appliances: appliancesVa.map((va, index) => ({ id: `a${index}`,
    words: 'Appliance', va })),
});
const optional = (generalConnectedVa: number, hvac: Partial<Hvac>) =>
  load22082({ edition: '2023', generalConnectedVa, hvac: { ...noHvac, ...hvac }, serviceAmps: 200, volts: 240 });

describe('published examples of load calculation', () => {
  const d1a = standardLoad({
    edition: '2023', floorAreaFt2: 1500, smallApplianceCircuits: 2, laundryCircuits: 1, rangeDemandVa: rangeDemandVa(12_000), dryerVa: 5500,
    fixedAppliancesVa: [], volts: 240,
  });

  it('NEC Annex D, Example D1(a): 5,100 VA of lighting, 18,600 VA, 78 A; neutral 14,550 VA, 61 A', () => {
    expect(d1a.lightingDemandVa).toBe(5100);
    expect(d1a.calculatedVa).toBe(18_600);
    expect(Math.round(d1a.amps)).toBe(78);
    expect(d1a.neutralVa).toBeCloseTo(14_550, 6);
    expect(Math.round(d1a.neutralVa / 240)).toBe(61);
  });

  it('NEC Annex D, Example D1(b): 6 A cooling on both legs; leg A 99 A with 12 A cooling, leg B 104 A with disposer 8 A and dishwasher 10 A', () => {
    const bothLegsAmps = Math.round(d1a.amps);
    expect(legAmps(bothLegsAmps, [6, 12])).toBe(99);
    expect(legAmps(bothLegsAmps, [6, 8], [10])).toBe(104);
  });

  it('NEC Annex D, Example D2(a): 29,700 VA connected, 17,880 VA, heat 3,600 VA, 21,480 VA in all', () => {
    const general = connected(1500, 12_000, 2500, 1200, 5000);
    const load = optional(general, { coolingVa: 6 * 230, roomHeatersVa: 9000, roomHeaterCount: 5 });
    expect([general, load.generalDemandVa, load.hvacVa, load.calculatedVa]).toEqual([29_700, 17_880, 3600, 21_480]);
  });

  it('NEC Annex D, Example D2(b): 32,800 VA connected, 19,120 VA, cooling 10,080 VA, 29,200 VA, 122 A', () => {
    const general = connected(1500, 4000, 4000, 5100, 4500, 1200, 5000);
    const load = optional(general, { coolingVa: 6 * 7 * 240, roomHeatersVa: 1500, roomHeaterCount: 1 });
    expect([general, load.generalDemandVa, load.hvacVa, load.calculatedVa]).toEqual([32_800, 19_120, 10_080, 29_200]);
    expect(Math.round(load.amps)).toBe(122);
  });

  it('NEC Annex D, Example D2(c): 33,200 VA connected, 19,280 VA, heat pump and strips 15,510 VA, 34,790 VA', () => {
    const general = connected(2000, 12_000, 4500, 1200, 5000);
    const load = optional(general, { heatPumpVa: 24 * 240, supplementalHeatVa: 15_000 });
    expect([general, load.generalDemandVa, load.hvacVa, load.calculatedVa]).toEqual([33_200, 19_280, 15_510, 34_790]);
  });

  it('trade training example by 220.82 (2014): 36,400 VA connected, 20,560 VA, heat 9,750 VA, 30,310 VA, 126 A', () => {
    const general = connected(2800, 14_000, 3000, 5000, 1500);
    const load = optional(general, { coolingVa: 29 * 240, centralHeatVa: 15_000 });
    expect([general, load.generalDemandVa, load.hvacVa, load.calculatedVa]).toEqual([36_400, 20_560, 9750, 30_310]);
    expect(Math.round(load.amps)).toBe(126);
  });

  it('municipal code example by the standard method at 230 V: 5,100 W and 8,000 W, 13,100 W', () => {
    const load = standardLoad({
      edition: '2020', floorAreaFt2: 1500, smallApplianceCircuits: 2, laundryCircuits: 1, rangeDemandVa: rangeDemandVa(12_000), dryerVa: 0,
      fixedAppliancesVa: [], volts: 230,
    });
    expect([load.lightingDemandVa, load.calculatedVa]).toEqual([5100, 13_100]);
  });

  it('completed worksheet: 12,900 VA gives 6,465 VA; four appliances at 75 % give 900, 774, 720 and 845.25 VA', () => {
    expect(lightingDemandVa(connected(2800))).toBe(6465);
    expect(fixedApplianceDemandVa([1200, 1032, 960, 1127])).toBe(900 + 774 + 720 + 845.25);
  });

  it('published question on 220.83(A): 21,500 VA gives 13,400 VA, 55 A (truncated); with 11,200 VA more, 17,880 VA by its arithmetic',
    () => {
    const load = load22083A('2020', connected(1000, 8000, 5000, 1000), 240);
    expect(load.calculatedVa).toBe(13_400);
    expect(Math.trunc(load.amps)).toBe(55);
    expect(load22083A('2020', 21_500 + 11_200, 240)).toMatchObject({ calculatedVa: 17_880, amps: 74.5 });
  });

  it.each([[48_000, 100], [63_000, 125], [78_000, 150], [108_000, 200], [123_000, 225]])(
    'city worksheet (from memory): %i W connected fill a panel of %i A', (connectedVa, panelAmps) => {
      expect(load22083A('2020', connectedVa, 240).amps).toBe(panelAmps);
    },
  );

  it('NEC 2026 Annex D.15, in part: 29,040 VA is 121 A; with a limit of 100 A the other 17,040 VA leave 29 A (arithmetic made here)',
    () => {
    expect(29_040 / 240).toBe(121);
    expect(chargingAmpsWithin(100, 17_040 / 240, 50)).toBe(29);
  });
});

describe('published examples of conduit fill', () => {
  it('three 12, four 10, eight 8 AWG THWN take 0.4171 sq in. and a 1-1/4 EMT', () => {
    const fill = smallestRaceway('EMT', [
      { areaIn2: conductorAreaIn2('12'), count: 3 }, { areaIn2: conductorAreaIn2('10'), count: 4 }, { areaIn2: conductorAreaIn2('8'),
        count: 8 },
    ]);
    expect(fill).toMatchObject({ tradeSize: '1-1/4', conductorAreaIn2: 0.4171 });
  });

  it('a mixture of insulations takes 0.4027 sq in. and a 1-1/4 EMT (14 AWG THW 0.0139 and 10 AWG RHH 0.0437 from memory)', () => {
    const fill = smallestRaceway('EMT', [
      { areaIn2: conductorAreaIn2('12'), count: 3 }, { areaIn2: 0.0139, count: 3 }, { areaIn2: 0.0437, count: 3 },
      { areaIn2: conductorAreaIn2('6', 'XHHW'), count: 3 }, { areaIn2: 0.013, count: 1 },
    ]);
    expect(fill).toMatchObject({ tradeSize: '1-1/4', conductorAreaIn2: 0.4027 });
    expect(allowedAreaIn2('EMT', '1', 13)).toBe(0.346);
  });
});
