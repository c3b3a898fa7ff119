import { haversineM } from './geo';

/** Below this a bicycle is standing (2.5 km/h) and its receiver only jitters (common practice, no source). */
const STANDING_M_PER_S = 0.7;
/** A receiver at rest wanders about this far, metres (common practice, no source). */
const JITTER_M = 3;

interface Place {
  lat: number;
  lon: number;
  /** Epoch milliseconds, null when the point carries no time. */
  time: number | null;
}

/**
 * Measures a track point by point, keeping nothing but sums, so that a million points cost no memory.
 * Distance is counted from an anchor that stays put while the bicycle stands within the jitter of its
 * receiver; segments are not joined.
 */
export class TrackMeter {
  distanceM = 0;
  movingS = 0;
  points = 0;
  untimed = 0;
  firstTime: number | null = null;
  lastTime: number | null = null;
  private anchor: Place | null = null;
  private previous: Place | null = null;

  /** Adds a point; degrees and epoch milliseconds. */
  add(lat: number, lon: number, time: number | null): void {
    const place = { lat, lon, time };
    this.points += 1;
    if (time === null) this.untimed += 1;
    else this.reach(time);
    if (this.anchor && this.previous) this.step(this.anchor, this.previous, place);
    else this.anchor = place;
    this.previous = place;
  }

  /** Ends a segment: the next point starts anew. */
  breakSegment(): void {
    this.anchor = this.previous = null;
  }

  /** Takes over the sums of another track of the same ride. */
  join(other: TrackMeter): void {
    this.distanceM += other.distanceM;
    this.movingS += other.movingS;
    this.points += other.points;
    this.untimed += other.untimed;
    if (other.firstTime !== null) this.reach(other.firstTime);
    if (other.lastTime !== null) this.reach(other.lastTime);
  }

  private reach(time: number): void {
    this.firstTime = this.firstTime === null ? time : Math.min(this.firstTime, time);
    this.lastTime = this.lastTime === null ? time : Math.max(this.lastTime, time);
  }

  private step(anchor: Place, previous: Place, place: Place): void {
    const seconds =
      place.time === null || previous.time === null ? null : (place.time - previous.time) / 1000;
    const stride = haversineM(previous.lat, previous.lon, place.lat, place.lon);
    const standing = seconds !== null && seconds > 0 && stride < STANDING_M_PER_S * seconds;
    if (!standing && seconds !== null && seconds > 0) this.movingS += seconds;
    const away = haversineM(anchor.lat, anchor.lon, place.lat, place.lon);
    if (standing && away < JITTER_M) return;
    this.distanceM += anchor === previous ? stride : away;
    this.anchor = place;
  }
}
