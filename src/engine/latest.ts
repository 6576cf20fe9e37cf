/**
 * Lets one job run at a time and keeps only the newest of those that wait: typing never queues up old sheets.
 * `run` starts a job; call `finished` when its answer is in.
 */
export class Latest<Job> {
  #running = false;
  #waiting: { job: Job } | null = null;

  constructor(private readonly run: (job: Job) => void) {}

  submit(job: Job): void {
    if (this.#running) {
      this.#waiting = { job };
      return;
    }
    this.#running = true;
    this.run(job);
  }

  /** True when a newer job has started in its place. */
  finished(): boolean {
    const next = this.#waiting;
    this.#waiting = null;
    this.#running = next !== null;
    if (next) this.run(next.job);
    return next !== null;
  }
}
