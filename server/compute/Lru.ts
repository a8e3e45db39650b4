/** Keeps what was used last, up to a sum of sizes. */
export class Lru<Value> {
  private readonly entries = new Map<string, { readonly value: Value; readonly size: number }>();
  private total = 0;

  constructor(private readonly capacity: number) {}

  get(key: string): Value | undefined {
    const entry = this.entries.get(key);
    if (entry === undefined) return undefined;
    this.entries.delete(key);
    this.entries.set(key, entry);
    return entry.value;
  }

  set(key: string, value: Value, size: number): void {
    this.remove(key);
    this.entries.set(key, { value, size });
    this.total += size;
    for (const oldest of this.entries.keys()) {
      if (this.total <= this.capacity || oldest === key) break;
      this.remove(oldest);
    }
  }

  private remove(key: string): void {
    const entry = this.entries.get(key);
    if (entry === undefined) return;
    this.entries.delete(key);
    this.total -= entry.size;
  }
}
