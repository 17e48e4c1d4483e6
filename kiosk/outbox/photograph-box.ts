import { sentenceOf } from '#src/lib/http.ts';
import { failureOf, waitAfterFailures } from './delivery.ts';
import type { PhotographStore, WaitingPhotograph } from './photograph-store.ts';

/** What the box shows: the photographs that wait, oldest first, and whether they would outlive the page. */
export interface PhotographView {
  readonly waiting: readonly WaitingPhotograph[];
  readonly isKept: boolean;
}

/** What the box needs from outside. */
export interface PhotographBoxOptions {
  readonly store: PhotographStore;
  readonly send: (photograph: WaitingPhotograph) => Promise<unknown>;
}

const byTime = (a: WaitingPhotograph, b: WaitingPhotograph): number => a.takenAt.localeCompare(b.takenAt);

/**
 * The photographs on their way to the server: kept on the device before they are sent, sent under one mark, tried again
 * while the server is away, and forgotten only when it has them, or when someone has read why it will not.
 */
export class PhotographBox {
  private readonly options: PhotographBoxOptions;
  private readonly listeners = new Set<() => void>();
  private current: PhotographView = { waiting: [], isKept: true };
  private personId: string | null = null;
  private isDelivering = false;
  private failures = 0;
  private timer: ReturnType<typeof setTimeout> | undefined;

  constructor(options: PhotographBoxOptions) {
    this.options = options;
  }

  /** Reads what an earlier page left behind. */
  async load(): Promise<void> {
    try {
      const kept = await this.options.store.all();
      this.change({ waiting: [...kept].sort(byTime) });
    } catch {
      this.change({ isKept: false });
    }
  }

  /** The view in force; a new object whenever it changes. */
  readonly view = (): PhotographView => this.current;

  /** Calls `listener` on every change until the returned function is called. */
  readonly subscribe = (listener: () => void): (() => void) => {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  };

  /** Says who is signed in; their photographs are delivered from now on. */
  setPerson(personId: string | null): void {
    this.personId = personId;
    if (personId !== null) this.tryNow();
  }

  /** Takes a photograph; resolves once it is kept on the device, or is known to live only as long as the page. */
  async add(photograph: WaitingPhotograph): Promise<void> {
    this.change({ waiting: [...this.current.waiting, photograph] });
    await this.keep(photograph);
    this.tryNow();
  }

  /** Tries to deliver without waiting any longer. */
  tryNow(): void {
    clearTimeout(this.timer);
    void this.deliver();
  }

  /** Forgets a photograph whose refusal has been read. */
  async dismiss(id: string): Promise<void> {
    await this.forget(id);
  }

  private change(part: Partial<PhotographView>): void {
    this.current = { ...this.current, ...part };
    for (const listener of this.listeners) listener();
  }

  private async keep(photograph: WaitingPhotograph): Promise<void> {
    try {
      await this.options.store.put(photograph);
    } catch {
      this.change({ isKept: false });
    }
  }

  private next(): WaitingPhotograph | undefined {
    return this.current.waiting.find(
      ({ personId, refusal }) => personId === this.personId && refusal === undefined,
    );
  }

  private async deliver(): Promise<void> {
    if (this.isDelivering) return;
    this.isDelivering = true;
    try {
      for (let photograph = this.next(); photograph; photograph = this.next()) {
        if (!(await this.attempt(photograph))) return;
        this.failures = 0;
      }
    } finally {
      this.isDelivering = false;
    }
  }

  /** Sends one photograph; false when the rest has to wait. */
  private async attempt(photograph: WaitingPhotograph): Promise<boolean> {
    try {
      await this.options.send(photograph);
      await this.forget(photograph.id);
      return true;
    } catch (error) {
      return this.fail(photograph, error);
    }
  }

  private async fail(photograph: WaitingPhotograph, error: unknown): Promise<boolean> {
    switch (failureOf(error)) {
      case 'refused': {
        const refused = { ...photograph, refusal: sentenceOf(error) };
        this.change({
          waiting: this.current.waiting.map((each) => (each.id === photograph.id ? refused : each)),
        });
        await this.keep(refused);
        return true;
      }
      case 'sign-in':
        this.personId = null;
        return false;
      case 'later':
        this.failures += 1;
        this.timer = setTimeout(() => void this.deliver(), waitAfterFailures(this.failures));
        return false;
    }
  }

  private async forget(id: string): Promise<void> {
    this.change({ waiting: this.current.waiting.filter((each) => each.id !== id) });
    try {
      await this.options.store.remove(id);
    } catch {
      // It stays on the device and is sent again after a reload; its mark makes that harmless.
    }
  }
}
