/** Lets one task run at a time, in the order of asking. */
export class Mutex {
  private last: Promise<unknown> = Promise.resolve();

  async run<Result>(task: () => Promise<Result>): Promise<Result> {
    const turn = this.last.then(task, task);
    // The chain must go on after a failure; the failure itself belongs to whoever asked.
    this.last = turn.catch(() => undefined);
    return turn;
  }
}
