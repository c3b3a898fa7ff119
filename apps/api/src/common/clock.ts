import { Injectable } from '@nestjs/common';

/** The calendar day, YYYY-MM-DD, that `instant` falls on in `timeZone`. */
export function dayIn(timeZone: string, instant: Date): string {
  return new Intl.DateTimeFormat('en-CA', { timeZone, dateStyle: 'short' }).format(instant);
}

/** The only source of the time, so that tests can move it. */
@Injectable()
export class Clock {
  private offsetMs = 0;

  now(): Date {
    return new Date(Date.now() + this.offsetMs);
  }

  /** Today in `timeZone`, YYYY-MM-DD. */
  today(timeZone: string): string {
    return dayIn(timeZone, this.now());
  }

  /** Moves the clock on; the test hook and nothing else calls it. */
  advance(days: number): void {
    this.offsetMs += days * 86_400_000;
  }
}
