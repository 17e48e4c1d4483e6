import { describe, expect, it, vi } from 'vitest';
import { problemType } from '#shared/contracts/problem.ts';
import { ProblemError, UnreachableError } from '#src/lib/http.ts';
import { PhotographBox } from './photograph-box.ts';
import type { PhotographStore, WaitingPhotograph } from './photograph-store.ts';

const photograph = (id: string, overrides: Partial<WaitingPhotograph> = {}): WaitingPhotograph => ({
  id,
  meltId: 'melt',
  personId: 'ines',
  takenAt: '2026-12-01T10:00:00.000Z',
  picture: new Blob([id], { type: 'image/jpeg' }),
  ...overrides,
});

/** A store that lives as long as the test, the way a disk outlives a page. */
const memoryStore = (): PhotographStore & { readonly kept: Map<string, WaitingPhotograph> } => {
  const kept = new Map<string, WaitingPhotograph>();
  return {
    kept,
    all: () => Promise.resolve([...kept.values()]),
    put: (each) => Promise.resolve(void kept.set(each.id, each)),
    remove: (id) => Promise.resolve(void kept.delete(id)),
  };
};

/** A box before a server that answers each try in turn, and takes everything once the answers run out. */
const setUp = (answers: (Error | null)[] = [], store = memoryStore()) => {
  const sent: string[] = [];
  const box = new PhotographBox({
    store,
    send: ({ id }) => {
      sent.push(id);
      const answer = answers.shift() ?? null;
      return answer ? Promise.reject(answer) : Promise.resolve();
    },
  });
  return { box, sent, store };
};

const refusal = new ProblemError({ type: problemType('not-allowed'), title: 'Not here.', status: 403 });

describe('PhotographBox', () => {
  it('keeps a photograph until its own person is signed in, then sends it once', async () => {
    const { box, sent, store } = setUp();
    box.setPerson('tomas');
    await box.add(photograph('a'));
    expect([...store.kept.keys()]).toEqual(['a']);
    expect(sent).toEqual([]);
    box.setPerson('ines');
    await vi.waitFor(() => expect(store.kept.size).toBe(0));
    expect(sent).toEqual(['a']);
    expect(box.view().waiting).toEqual([]);
  });

  it('sends what an earlier page left behind, the oldest first', async () => {
    const store = memoryStore();
    await store.put(photograph('later', { takenAt: '2026-12-01T11:00:00.000Z' }));
    await store.put(photograph('first'));
    const { box, sent } = setUp([], store);
    await box.load();
    box.setPerson('ines');
    await vi.waitFor(() => expect(sent).toEqual(['first', 'later']));
  });

  it('keeps it while the server is away and tries again by itself', async () => {
    const { box, sent, store } = setUp([new UnreachableError()]);
    box.setPerson('ines');
    await box.add(photograph('a'));
    await vi.waitFor(() => expect(sent).toEqual(['a']));
    expect(store.kept.size).toBe(1);
    await vi.waitFor(() => expect(store.kept.size).toBe(0), { timeout: 10_000 });
    expect(sent).toEqual(['a', 'a']);
  });

  it('keeps one that was refused, with why, until that has been read', async () => {
    const { box, store } = setUp([refusal]);
    box.setPerson('ines');
    await box.add(photograph('a'));
    await vi.waitFor(() => expect(store.kept.get('a')?.refusal).toBe('Not here.'));
    expect(box.view().waiting).toMatchObject([{ id: 'a', refusal: 'Not here.' }]);
    await box.dismiss('a');
    expect(store.kept.size).toBe(0);
  });

  it('says so when the device keeps nothing', async () => {
    const store = { ...memoryStore(), put: () => Promise.reject(new Error('full')) };
    const { box } = setUp([new UnreachableError()], store);
    await box.add(photograph('a'));
    expect(box.view()).toMatchObject({ isKept: false, waiting: [{ id: 'a' }] });
  });
});
