import type { MeltEvent } from '#shared/contracts/card.ts';
import { sentenceOf } from '#src/lib/http.ts';
import { failureOf, waitAfterFailures } from './delivery.ts';
import type { NewOutboxEntry, OutboxEntry, OutboxStore } from './outbox-entry.ts';

/** An entry that the server would not take, with its sentence. */
export interface Refusal {
  readonly key: string;
  readonly castingId: string;
  readonly sentence: string;
}

/** What the outbox shows: entries in the order they happened, how delivery goes, and what was refused. */
export interface OutboxView {
  readonly entries: readonly OutboxEntry[];
  readonly status: 'idle' | 'sending' | 'unreachable' | 'sign-in';
  readonly refusals: readonly Refusal[];
  /** False once an entry could not be kept on the device: it then lives only as long as this page. */
  readonly isKept: boolean;
}

/** What the outbox needs from outside. */
export interface OutboxOptions {
  readonly store: OutboxStore;
  readonly send: (entry: OutboxEntry) => Promise<MeltEvent>;
  /** The entry is forgotten only once this is done, so that screens never lack it in between. */
  readonly onDelivered: (entry: OutboxEntry, recorded: MeltEvent) => void | Promise<void>;
  readonly onRefused: (entry: OutboxEntry) => void;
  /** The server no longer knows who is at this terminal. */
  readonly onSignedOut: () => void;
}

const byOrder = (a: OutboxEntry, b: OutboxEntry): number => a.order - b.order;

/**
 * The events of cards on their way to the server. Each is kept on the device before it is sent, sent in order under
 * one key, tried again while the server is away, and forgotten only when the server has it or refuses it.
 */
export class Outbox {
  private readonly options: OutboxOptions;
  private readonly listeners = new Set<() => void>();
  private current: OutboxView = { entries: [], status: 'idle', refusals: [], isKept: true };
  private personId: string | null = null;
  private isDelivering = false;
  private failures = 0;
  private timer: ReturnType<typeof setTimeout> | undefined;

  constructor(options: OutboxOptions) {
    this.options = options;
  }

  /** Reads what an earlier page left behind. */
  async load(): Promise<void> {
    try {
      const kept = await this.options.store.all();
      this.change({ entries: [...kept].sort(byOrder) });
    } catch {
      this.change({ isKept: false });
    }
  }

  /** The view in force; a new object whenever it changes. */
  readonly view = (): OutboxView => this.current;

  /** Calls `listener` on every change until the returned function is called. */
  readonly subscribe = (listener: () => void): (() => void) => {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  };

  /** Says who is signed in; their entries are delivered from now on. */
  setPerson(personId: string | null): void {
    this.personId = personId;
    if (personId !== null) this.tryNow();
  }

  /** Takes an event: shown at once, kept on the device, then sent. */
  async add(entry: NewOutboxEntry): Promise<void> {
    const kept = { ...entry, order: (this.current.entries.at(-1)?.order ?? 0) + 1 };
    this.change({ entries: [...this.current.entries, kept] });
    try {
      await this.options.store.put(kept);
    } catch {
      this.change({ isKept: false });
    }
    this.tryNow();
  }

  /** Tries to deliver without waiting any longer. */
  tryNow(): void {
    clearTimeout(this.timer);
    void this.deliver();
  }

  /** Forgets a refusal that has been read. */
  dismiss(key: string): void {
    this.change({ refusals: this.current.refusals.filter((refusal) => refusal.key !== key) });
  }

  private change(part: Partial<OutboxView>): void {
    this.current = { ...this.current, ...part };
    for (const listener of this.listeners) listener();
  }

  private next(): OutboxEntry | undefined {
    return this.current.entries.find(({ personId }) => personId === this.personId);
  }

  private async deliver(): Promise<void> {
    if (this.isDelivering) return;
    this.isDelivering = true;
    try {
      for (let entry = this.next(); entry; entry = this.next()) {
        this.change({ status: 'sending' });
        if (!(await this.attempt(entry))) return;
        this.failures = 0;
      }
      this.change({ status: 'idle' });
    } finally {
      this.isDelivering = false;
    }
  }

  /** Sends one entry; false when the rest has to wait. */
  private async attempt(entry: OutboxEntry): Promise<boolean> {
    try {
      const recorded = await this.options.send(entry);
      await this.options.onDelivered(entry, recorded);
      await this.forget(entry);
      return true;
    } catch (error) {
      return this.fail(entry, error);
    }
  }

  private async fail(entry: OutboxEntry, error: unknown): Promise<boolean> {
    switch (failureOf(error)) {
      case 'refused':
        this.change({
          refusals: [
            ...this.current.refusals,
            { key: entry.key, castingId: entry.castingId, sentence: sentenceOf(error) },
          ],
        });
        await this.forget(entry);
        this.options.onRefused(entry);
        return true;
      case 'sign-in':
        this.personId = null;
        this.change({ status: 'sign-in' });
        this.options.onSignedOut();
        return false;
      case 'later':
        this.failures += 1;
        this.change({ status: 'unreachable' });
        this.timer = setTimeout(() => void this.deliver(), waitAfterFailures(this.failures));
        return false;
    }
  }

  private async forget({ key }: OutboxEntry): Promise<void> {
    this.change({ entries: this.current.entries.filter((entry) => entry.key !== key) });
    try {
      await this.options.store.remove(key);
    } catch {
      // It stays on the device and is sent again after a reload; its key makes that harmless.
    }
  }
}
