/** CPU seconds of this process, all its threads together, less the pauses. CPU time, because cores are shared. */
export class Stopwatch {
  #spent = 0;
  #since = process.cpuUsage();

  get seconds() {
    return this.#since === undefined ? this.#spent : this.#spent + secondsSince(this.#since);
  }

  /** Does something that does not count. */
  aside(work) {
    this.#spent = this.seconds;
    this.#since = undefined;
    const outcome = work();
    this.#since = process.cpuUsage();
    return outcome;
  }
}

function secondsSince(mark) {
  const { user, system } = process.cpuUsage(mark);
  return (user + system) / 1e6;
}
