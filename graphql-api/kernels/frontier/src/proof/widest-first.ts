/** A heap of things with a gap each, the widest on top; equal gaps in the order of arrival. */
export class WidestFirst<T> {
  private readonly entries: { readonly gap: number; readonly turn: number; readonly value: T }[] = [];
  private turns = 0;

  get size(): number {
    return this.entries.length;
  }

  add(gap: number, value: T): void {
    const { entries } = this;
    const entry = { gap, turn: this.turns++, value };
    let at = entries.length;
    entries.push(entry);
    while (at > 0) {
      const parent = (at - 1) >> 1;
      if (!this.isBefore(entry, entries[parent])) break;
      entries[at] = entries[parent];
      at = parent;
    }
    entries[at] = entry;
  }

  take(): T | undefined {
    const { entries } = this;
    const top = entries[0];
    const last = entries.pop();
    if (last !== undefined && entries.length > 0) this.sink(last);
    return top?.value;
  }

  values(): T[] {
    return this.entries.map(({ value }) => value);
  }

  private sink(entry: (typeof this.entries)[number]): void {
    const { entries } = this;
    let at = 0;
    for (;;) {
      let child = 2 * at + 1;
      if (child >= entries.length) break;
      if (child + 1 < entries.length && this.isBefore(entries[child + 1], entries[child])) child++;
      if (!this.isBefore(entries[child], entry)) break;
      entries[at] = entries[child];
      at = child;
    }
    entries[at] = entry;
  }

  private isBefore(one: (typeof this.entries)[number], other: (typeof this.entries)[number]): boolean {
    return one.gap > other.gap || (one.gap === other.gap && one.turn < other.turn);
  }
}
