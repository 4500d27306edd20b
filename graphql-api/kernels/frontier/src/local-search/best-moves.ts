/** The few moves of highest score among many offered, highest first; of equal scores the first offered wins. */
export class BestMoves {
  readonly moves: number[] = [];
  private readonly scores: number[] = [];

  /** Only scores above `least` count. */
  constructor(
    private readonly capacity: number,
    private readonly least: number,
  ) {}

  /** A move is only worth offering with a higher score than this. */
  get threshold(): number {
    return this.moves.length < this.capacity ? this.least : this.scores[this.capacity - 1];
  }

  offer(move: number, score: number): void {
    if (score <= this.threshold) return;
    let place = Math.min(this.moves.length, this.capacity - 1);
    while (place > 0 && this.scores[place - 1] < score) {
      this.moves[place] = this.moves[place - 1];
      this.scores[place] = this.scores[place - 1];
      place--;
    }
    this.moves[place] = move;
    this.scores[place] = score;
  }
}
