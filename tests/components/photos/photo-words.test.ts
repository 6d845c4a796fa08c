import { mostWanted, slotWorth, uploadFailure, worthWords } from '../../../components/photos/photo-words';
import { NetworkError, ProblemError } from '../../../components/api/client';

// Figures from the design's phone picture of the photos ("narrow this by about $380") and otherwise invented.
const narrowing = [
  { fact: 'room', title: 'Garage plan', cents: 51_000, photo: null },
  { fact: 'mainBreakerAmps', title: 'Photo of the panel label', cents: 38_000, photo: 'label' },
  { fact: 'blankSpaces', title: 'Blank spaces', cents: 24_000, photo: 'panel' },
  { fact: 'panelMount', title: 'Mounting', cents: 3_000, photo: 'panel' },
];

describe('what a photo is worth', () => {
  it('is the largest question it can answer', () => {
    expect(slotWorth('panel', narrowing)).toBe(24_000);
    expect(slotWorth('meter', narrowing)).toBeNull();
    expect(worthWords(38_000)).toBe('Would narrow your range by about $380');
  });
  it('points to the one that is worth most and not there yet', () => {
    expect(mostWanted(narrowing, new Set())).toBe('label');
    expect(mostWanted(narrowing, new Set(['label']))).toBe('panel');
    expect(mostWanted(narrowing, new Set(['label', 'panel']))).toBeNull();
  });
});

it('has its own words for each way a picture can fail', () => {
  const refused = (status: number, detail?: string) => new ProblemError({ type: 'about:blank', title: 'No', status, ...(detail ? { detail } : {}) });
  const words = [new NetworkError(), refused(413), refused(415), refused(429)].map(uploadFailure);
  expect(new Set(words).size).toBe(4);
  expect(uploadFailure(refused(415, 'HEIC pictures cannot be read yet.'))).toBe('HEIC pictures cannot be read yet.');
});
