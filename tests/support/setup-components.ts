import '@testing-library/react-native';

// A component that complains about its own props, keys or state is a defect: it fails the test that shows it.
let complaints: string[] = [];
let spy: jest.SpyInstance;

beforeEach(() => {
  complaints = [];
  spy = jest.spyOn(console, 'error').mockImplementation((...words: unknown[]) => {
    complaints.push(words.map(String).join(' ').slice(0, 1_000));
  });
});
afterEach(() => {
  spy.mockRestore();
  expect(complaints).toEqual([]);
});
