import type { Answers } from '../../../shared/wizard/index';
import { createAnswerQueue, withUnsaved, type SendResult } from '../../../components/wizard/answer-queue';

// Expected behavior: the product's rule "every answer saved on the server as it is given; nothing is lost". Answers invented.
function stage(results: SendResult[]) {
  const sent: { answers: Answers; leaving: boolean }[] = [];
  const queue = createAnswerQueue({
    send: (answers, leaving) => {
      sent.push({ answers, leaving });
      return Promise.resolve(results.shift() ?? { kind: 'saved' });
    },
    retryAfterMs: [1_000, 5_000],
  });
  return { queue, sent };
}
const settle = () => jest.advanceTimersByTimeAsync(0);

describe('the queue of answers', () => {
  beforeEach(() => { jest.useFakeTimers(); });
  afterEach(() => { jest.useRealTimers(); });

  it('keeps answers given before the intake is there, and sends them together once it is', async () => {
    const { queue, sent } = stage([]);
    queue.set('zip', '00017');
    queue.set('homeKind', 'house');
    await settle();
    expect(sent).toEqual([]);
    expect(queue.state()).toMatchObject({ save: 'waiting', unsaved: { zip: '00017', homeKind: 'house' } });
    queue.open();
    await settle();
    expect(sent).toEqual([{ answers: { zip: '00017', homeKind: 'house' }, leaving: false }]);
    expect(queue.state()).toMatchObject({ save: 'saved', unsaved: {} });
  });

  it('sends one request at a time, the last word for each answer, in order', async () => {
    const { queue, sent } = stage([]);
    queue.open();
    queue.set('a', 1);
    queue.set('a', 2);
    queue.set('b', 3);
    await settle();
    expect(sent.map((entry) => entry.answers)).toEqual([{ a: 1 }, { a: 2, b: 3 }]);
  });

  it('waits for a pause in typing, unless it is told to send now', async () => {
    const { queue, sent } = stage([]);
    queue.open();
    queue.set('miles', 3, 400);
    await jest.advanceTimersByTimeAsync(300);
    queue.set('miles', 35, 400);
    await jest.advanceTimersByTimeAsync(300);
    expect(sent).toEqual([]);
    await jest.advanceTimersByTimeAsync(100);
    expect(sent.map((entry) => entry.answers)).toEqual([{ miles: 35 }]);
    queue.set('miles', 40, 400);
    await queue.flush();
    expect(sent.at(-1)?.answers).toEqual({ miles: 40 });
  });

  it('keeps what could not be sent on the screen, says so, and tries again with newer answers winning', async () => {
    const { queue, sent } = stage([{ kind: 'failed' }, { kind: 'failed' }]);
    queue.open();
    queue.set('a', 1);
    await settle();
    expect(queue.state().save).toBe('failed');
    expect(queue.state().unsaved).toMatchObject({ a: 1 });
    queue.set('b', 2, 60_000);
    await jest.advanceTimersByTimeAsync(60_000);
    expect(queue.state()).toMatchObject({ save: 'failed', unsaved: { a: 1, b: 2 } });
    await jest.advanceTimersByTimeAsync(5_000);
    expect(sent.at(-1)?.answers).toEqual({ a: 1, b: 2 });
    expect(queue.state()).toMatchObject({ save: 'saved', unsaved: {} });
  });

  it('leaves a refused answer where it was typed, with the reason, and saves the others', async () => {
    const { queue, sent } = stage([{ kind: 'refused', fields: { room: '60 ft at most' } }]);
    queue.open();
    queue.set('x', 0, 400);
    queue.set('room', 500);
    await settle();
    expect(sent.map((entry) => entry.answers)).toEqual([{ x: 0, room: 500 }, { x: 0 }]);
    expect(queue.state()).toEqual({ save: 'saved', unsaved: { room: 500 }, refused: { room: '60 ft at most' } });
    queue.set('room', 20);
    await settle();
    expect(queue.state()).toEqual({ save: 'saved', unsaved: {}, refused: {} });
  });

  it('shows what is half typed without sending it, over what is on its way', async () => {
    const { queue, sent } = stage([]);
    queue.open();
    queue.set('zip', '00017');
    queue.hold('zip', '0001');
    expect(queue.state().unsaved).toEqual({ zip: '0001' });
    await settle();
    queue.set('miles', 35, 400);
    queue.hold('miles', 3_500);
    await jest.advanceTimersByTimeAsync(1_000);
    expect(sent.map((entry) => entry.answers)).toEqual([{ zip: '00017' }]);
    expect(queue.state()).toMatchObject({ save: 'saved', unsaved: { zip: '0001', miles: 3_500 } });
    await expect(queue.flush()).resolves.toBe(true);
  });

  it('stops sending when the intake is gone, and still shows what was answered', async () => {
    const { queue, sent } = stage([{ kind: 'gone' }]);
    queue.open();
    queue.set('a', 1);
    await settle();
    queue.set('b', 2);
    await jest.advanceTimersByTimeAsync(60_000);
    expect(sent).toHaveLength(1);
    expect(queue.state()).toMatchObject({ save: 'gone', unsaved: { a: 1, b: 2 } });
  });

  it('hands over what is left when the page is being left', () => {
    const { queue, sent } = stage([]);
    queue.open();
    queue.set('a', 1, 400);
    queue.leave();
    expect(sent).toEqual([{ answers: { a: 1 }, leaving: true }]);
  });
});

it('shows unsaved answers over saved ones, and none that were taken back', () => {
  expect(withUnsaved({ a: 1, b: 2 }, { b: 3, a: null })).toEqual({ b: 3 });
});
