/**
 * Steps that rise in both figures: at each place the highest value of a step at or before it. Kept apart from the step
 * lines the search uses, so that what checks a frontier shares nothing with what found it.
 */
export class Staircase {
  private readonly places: number[] = [];
  private readonly values: number[] = [];

  /** The value at a place; minus infinity before the first step. */
  at(place: number): number {
    const after = this.firstAfter(place);
    return after === 0 ? -Infinity : this.values[after - 1];
  }

  /** Adds a step, and drops those that it leaves without effect. */
  raise(place: number, value: number): void {
    if (this.at(place) >= value) return;
    let from = this.firstAfter(place);
    if (from > 0 && this.places[from - 1] === place) from--;
    let to = from;
    while (to < this.places.length && this.values[to] <= value) to++;
    this.places.splice(from, to - from, place);
    this.values.splice(from, to - from, value);
  }

  /** The places from one to another, both included, at which the staircase steps up. */
  stepsWithin(from: number, to: number): number[] {
    return this.places.slice(this.firstAfter(from - 1), this.firstAfter(to)).filter((place) => place >= from);
  }

  private firstAfter(place: number): number {
    let low = 0;
    let high = this.places.length;
    while (low < high) {
      const middle = (low + high) >>> 1;
      if (this.places[middle] <= place) low = middle + 1;
      else high = middle;
    }
    return low;
  }
}

/** Complexity: O(log n) for each step that comes after all others, as they do in a sorted list. */
export function staircaseOf(steps: readonly (readonly [place: number, value: number])[]): Staircase {
  const staircase = new Staircase();
  for (const [place, value] of steps) staircase.raise(place, value);
  return staircase;
}
