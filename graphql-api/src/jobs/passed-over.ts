import { Injectable } from '@nestjs/common';

/** The flags of jobs that this process does not take: the runs it works on already, with all its threads. */
@Injectable()
export class PassedOver {
  private readonly counts = new Map<string, number>();

  /** Passes jobs with the flag over while the work goes on. */
  async during<T>(flag: string, work: () => Promise<T>): Promise<T> {
    this.counts.set(flag, (this.counts.get(flag) ?? 0) + 1);
    try {
      return await work();
    } finally {
      const left = (this.counts.get(flag) ?? 1) - 1;
      if (left > 0) this.counts.set(flag, left);
      else this.counts.delete(flag);
    }
  }

  flags(): string[] {
    return [...this.counts.keys()];
  }
}
