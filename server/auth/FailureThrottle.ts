/**
 * Counts failed tries per key within a sliding window. It slows guessing without locking the
 * owner out: the window passes and the right password works again.
 */
export class FailureThrottle {
  private readonly failures = new Map<string, number[]>();

  constructor(
    private readonly limit: number,
    private readonly windowMs: number,
    private readonly clock: () => Date,
  ) {}

  /** Seconds to wait before the next try; 0 = go ahead. */
  retryAfter(key: string): number {
    const recent = this.recent(key);
    const oldest = recent[recent.length - this.limit];
    if (oldest === undefined) return 0;
    return Math.max(1, Math.ceil((oldest + this.windowMs - this.clock().getTime()) / 1000));
  }

  fail(key: string): void {
    const recent = this.recent(key);
    recent.push(this.clock().getTime());
    this.failures.set(key, recent);
    if (this.failures.size > 10_000) this.forgetOld();
  }

  clear(key: string): void {
    this.failures.delete(key);
  }

  private recent(key: string): number[] {
    const since = this.clock().getTime() - this.windowMs;
    return (this.failures.get(key) ?? []).filter((at) => at > since);
  }

  private forgetOld(): void {
    for (const key of this.failures.keys()) {
      if (this.recent(key).length === 0) this.failures.delete(key);
    }
  }
}
