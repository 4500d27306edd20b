/**
 * At most `capacity` points of a long sequence, evenly spread over it: every n-th is kept, and whenever the room is
 * full every second one goes and n doubles. Needs no random numbers and no look at the points in between.
 */
export class EvenSample {
  private points: [cost: number, benefit: number][] = [];
  private stride = 1;
  private next = 0;

  constructor(private readonly capacity: number) {
    if (capacity === 0) this.next = Infinity;
  }

  /** Number in the sequence (from 0) from which on the next point is wanted. */
  get nextWanted(): number {
    return this.next;
  }

  /** Takes the point of that number. */
  take(number: number, cost: number, benefit: number): void {
    this.points.push([cost, benefit]);
    if (this.points.length === this.capacity) {
      this.points = this.points.filter((_, index) => index % 2 === 1);
      this.stride *= 2;
    }
    this.skip(number);
  }

  /** Goes on without the point of that number. */
  skip(number: number): void {
    this.next = number + this.stride;
  }

  all(): [cost: number, benefit: number][] {
    return [...this.points];
  }
}
