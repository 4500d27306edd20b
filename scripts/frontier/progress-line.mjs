/** Progress on standard error: one line that changes if it is a terminal, else a line every few seconds. */
export class ProgressLine {
  #began = performance.now();
  #last = -Infinity;
  #isOpen = false;

  get seconds() {
    return (performance.now() - this.#began) / 1000;
  }

  /** `text` is a function, so that what is not shown need not be worked out. */
  show(text) {
    const pauseMs = process.stderr.isTTY ? 100 : 5_000;
    const now = performance.now();
    if (now - this.#last < pauseMs) return;
    this.#last = now;
    const line = `${this.seconds.toFixed(1)} s  ${text()}`;
    if (!process.stderr.isTTY) {
      process.stderr.write(`${line}\n`);
      return;
    }
    process.stderr.write(`\r\x1b[K${line.slice(0, (process.stderr.columns ?? 80) - 1)}`);
    this.#isOpen = true;
  }

  /** Ends with a line that stays. */
  end(text) {
    process.stderr.write(`${this.#isOpen ? '\r\x1b[K' : ''}${this.seconds.toFixed(1)} s  ${text}\n`);
    this.#isOpen = false;
  }
}
