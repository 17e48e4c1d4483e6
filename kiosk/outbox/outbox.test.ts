import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { problemType, type ProblemId } from '#shared/contracts/problem.ts';
import type { MeltEvent } from '#shared/contracts/card.ts';
import { ProblemError, UnreachableError } from '#src/lib/http.ts';
import { Outbox } from './outbox.ts';
import type { NewOutboxEntry, OutboxEntry, OutboxStore } from './outbox-entry.ts';

const problem = (id: ProblemId, status: number, title = 'No.'): ProblemError =>
  new ProblemError({ type: problemType(id), title, status });

const entry = (key: string, overrides: Partial<NewOutboxEntry> = {}): NewOutboxEntry => ({
  key,
  castingId: 'casting',
  meltId: 'melt',
  personId: 'ines',
  personName: 'Ines',
  occurredAt: '2026-12-01T10:00:00.000Z',
  event: { type: 'poured' },
  ...overrides,
});

/** A store that lives as long as the test, the way a disk outlives a page. */
const memoryStore = (
  kept = new Map<string, OutboxEntry>(),
): OutboxStore & { kept: Map<string, OutboxEntry> } => ({
  kept,
  all: () => Promise.resolve([...kept.values()].reverse()),
  put: (kind) => Promise.resolve(void kept.set(kind.key, kind)),
  remove: (key) => Promise.resolve(void kept.delete(key)),
});

/** An outbox before a server that answers each try in turn, and takes everything once the answers run out. */
const setUp = (answers: (Error | null)[] = [], store = memoryStore()) => {
  const sent: string[] = [];
  const keptAtSending: boolean[] = [];
  const onRefused = vi.fn();
  const onSignedOut = vi.fn();
  const outbox = new Outbox({
    store,
    send: ({ key, event, occurredAt }) => {
      sent.push(key);
      keptAtSending.push(store.kept.has(key));
      const answer = answers.shift() ?? null;
      if (answer) return Promise.reject(answer);
      return Promise.resolve({
        seq: 1,
        key,
        event,
        person: '',
        terminal: '',
        occurredAt,
        recordedAt: occurredAt,
      } as MeltEvent);
    },
    onDelivered: () => undefined,
    onRefused,
    onSignedOut,
  });
  return { outbox, sent, keptAtSending, store, onRefused, onSignedOut };
};

const settle = (): Promise<unknown> => vi.advanceTimersByTimeAsync(0);

beforeEach(() => vi.useFakeTimers());
afterEach(() => vi.useRealTimers());

describe('Outbox', () => {
  it('keeps an entry before it is sent, and forgets it once it is delivered', async () => {
    const { outbox, keptAtSending, store } = setUp();
    outbox.setPerson('ines');
    await outbox.add(entry('a'));
    await settle();
    expect(keptAtSending).toEqual([true]);
    expect(store.kept.size).toBe(0);
    expect(outbox.view()).toMatchObject({ entries: [], status: 'idle' });
  });

  it('shows an entry at once, before anything has answered', () => {
    const { outbox } = setUp();
    void outbox.add(entry('a'));
    expect(outbox.view().entries.map(({ key }) => key)).toEqual(['a']);
  });

  it('tries again under the same key and in order when the server is away', async () => {
    const { outbox, sent } = setUp([new UnreachableError(), new UnreachableError()]);
    outbox.setPerson('ines');
    await outbox.add(entry('a'));
    await settle();
    expect(outbox.view().status).toBe('unreachable');
    await outbox.add(entry('b'));
    await vi.advanceTimersByTimeAsync(30_000);
    expect(sent).toEqual(['a', 'a', 'a', 'b']);
    expect(outbox.view().entries).toEqual([]);
  });

  it('takes up what an earlier page left, in the order it happened', async () => {
    const store = memoryStore();
    const first = setUp([new UnreachableError()], store);
    first.outbox.setPerson('ines');
    await first.outbox.add(entry('a'));
    await first.outbox.add(entry('b'));
    first.outbox.setPerson(null);
    const second = setUp([], store);
    await second.outbox.load();
    expect(second.outbox.view().entries.map(({ key }) => key)).toEqual(['a', 'b']);
    second.outbox.setPerson('ines');
    await settle();
    expect(second.sent).toEqual(['a', 'b']);
  });

  it('drops what the server refuses, with its sentence, and goes on', async () => {
    const { outbox, sent, store, onRefused } = setUp([problem('event-refused', 409, 'Weigh more in.')]);
    outbox.setPerson('ines');
    await outbox.add(entry('a'));
    await outbox.add(entry('b'));
    await settle();
    expect(sent).toEqual(['a', 'b']);
    expect(outbox.view().refusals).toEqual([{ key: 'a', castingId: 'casting', sentence: 'Weigh more in.' }]);
    expect(onRefused).toHaveBeenCalledOnce();
    expect(store.kept.size).toBe(0);
    outbox.dismiss('a');
    expect(outbox.view().refusals).toEqual([]);
  });

  it('keeps everything when the session has ended, and delivers after the next sign-in', async () => {
    const { outbox, sent, onSignedOut } = setUp([problem('not-signed-in', 401)]);
    outbox.setPerson('ines');
    await outbox.add(entry('a'));
    await settle();
    expect(onSignedOut).toHaveBeenCalledOnce();
    expect(outbox.view()).toMatchObject({ status: 'sign-in', entries: [{ key: 'a' }] });
    outbox.setPerson('ines');
    await settle();
    expect(sent).toEqual(['a', 'a']);
  });

  it('never delivers in another person’s name', async () => {
    const { outbox, sent } = setUp();
    await outbox.add(entry('a'));
    outbox.setPerson('tomas');
    await settle();
    expect(sent).toEqual([]);
    expect(outbox.view().entries).toHaveLength(1);
  });

  it('says so when the device cannot keep an entry, and sends it all the same', async () => {
    const store = { ...memoryStore(), put: () => Promise.reject(new Error('full')) };
    const { outbox, sent } = setUp([], store);
    outbox.setPerson('ines');
    await outbox.add(entry('a'));
    await settle();
    expect(outbox.view().isKept).toBe(false);
    expect(sent).toEqual(['a']);
  });
});
