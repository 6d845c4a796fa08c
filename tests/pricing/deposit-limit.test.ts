import { depositLimit } from '../../pricing/deposit-limit';

describe('deposit limits; legal figures, to be confirmed before use', () => {
  it('CA BPC 7159.5: the lesser of 10 % and $1,000', () => {
    expect(depositLimit('CA', 999_900).limitCents).toBe(99_990);
    expect(depositLimit('CA', 1_000_000).limitCents).toBe(100_000);
    expect(depositLimit('CA', 1_500_000).limitCents).toBe(100_000);
    expect(depositLimit('CA', 185_055).limitCents).toBe(18_505);
  });
  it('MA c.142A s.2(a)(6): over $1,000, the greater of a third and the special order', () => {
    expect(depositLimit('MA', 300_000).limitCents).toBe(100_000);
    expect(depositLimit('MA', 300_000, 140_000).limitCents).toBe(140_000);
    expect(depositLimit('MA', 300_000, 400_000).limitCents).toBe(300_000);
    expect(depositLimit('MA', 100_000)).toEqual({ limitCents: null, clause: 'MA c.142A s.2 starts above $1,000' });
    expect(depositLimit('MA', 100_001).limitCents).toBe(33_333);
  });
  it('MD BR 8-617: a third, never a cent more', () => expect(depositLimit('MD', 200_000).limitCents).toBe(66_666));
  it('PA (secondary source): over $5,000, a third and the special order', () => {
    expect(depositLimit('PA', 500_000).limitCents).toBeNull();
    expect(depositLimit('PA', 600_000).limitCents).toBe(200_000);
    expect(depositLimit('PA', 600_000, 50_000).limitCents).toBe(250_000);
    expect(depositLimit('PA', 600_000, 900_000).limitCents).toBe(600_000);
  });
  it('ME (secondary source): a third', () => expect(depositLimit('ME', 300_000).limitCents).toBe(100_000));
  it('others, the invented state of the demo among them: no limit known', () => {
    expect(depositLimit('XX', 300_000)).toEqual({ limitCents: null, clause: 'no limit by state law is known' });
  });
});
