/** A failure that the person at the keyboard can act on: its message is one plain sentence. */
export class Trouble extends Error {
  name = 'Trouble';
}
