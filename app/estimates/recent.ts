/** A map that forgets what was asked for longest ago: what it holds can always be made again. */
export class Recent<Value> {
  private readonly entries = new Map<string, Value>();

  constructor(private readonly size: number) {}

  get(key: string): Value | undefined {
    const value = this.entries.get(key);
    if (value === undefined) return undefined;
    this.entries.delete(key);
    this.entries.set(key, value);
    return value;
  }

  set(key: string, value: Value): void {
    this.entries.delete(key);
    this.entries.set(key, value);
    for (const oldest of this.entries.keys()) {
      if (this.entries.size <= this.size) return;
      this.entries.delete(oldest);
    }
  }
}
