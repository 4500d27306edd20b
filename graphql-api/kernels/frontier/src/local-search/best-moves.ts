/** The few moves of highest score among many offered, highest first; of equal scores the first offered wins. */
export class BestMoves {
  readonly moves: number[] = [];
  private readonly scores: number[] = [];
  private capacity = 1;
  /** A move is only worth offering with a higher score than this. */
  threshold = -Infinity;

  constructor(capacity: number, least: number) {
    this.clear(capacity, least);
  }

  /** Forgets all moves; from now on keeps so many, and only with scores above `least`. */
  clear(capacity: number, least: number): void {
    this.moves.length = 0;
    this.scores.length = 0;
    this.capacity = capacity;
    this.threshold = least;
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
    if (this.moves.length === this.capacity) this.threshold = this.scores[this.capacity - 1];
  }
}
