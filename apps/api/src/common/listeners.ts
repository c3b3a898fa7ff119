/**
 * What later features ask to be told by an earlier one, which may not know them. Each is called in the transaction of
 * the change: what it writes or enqueues commits with it.
 */
export class Listeners<T> {
  private readonly listeners: ((event: T) => Promise<void>)[] = [];

  add(listener: (event: T) => Promise<void>): void {
    this.listeners.push(listener);
  }

  async tell(event: T): Promise<void> {
    for (const listener of this.listeners) await listener(event);
  }
}
