/** A file that cannot be read; the message is a plain sentence for the rider. */
export class UnreadableFile extends Error {
  constructor(message: string) {
    super(message);
    this.name = 'UnreadableFile';
  }
}
