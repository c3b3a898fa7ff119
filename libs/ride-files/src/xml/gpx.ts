import { fileTime, type FileTime } from '../day';
import { onEarth } from '../geo';
import { isCycling, sportInName } from '../sport';
import { TrackMeter } from '../track-meter';
import type { XmlReader } from './sax';

/** Tracks of one file further apart than this are two rides; a lunch is not (common practice, no source). */
const NEW_RIDE_AFTER_MS = 6 * 3600 * 1000;

export interface GpxTrack {
  meter: TrackMeter;
  sport: string | null;
  start: FileTime | null;
}

/** Reads GPX 1.0 and 1.1: tracks are measured as they stream by, routes and waypoints only counted. */
export class GpxReader implements XmlReader {
  readonly tracks: GpxTrack[] = [];
  routes = 0;
  waypoints = 0;
  private track: GpxTrack = emptyTrack();
  private name: string | null = null;
  private point: { lat: number; lon: number; time: FileTime | null } | null = null;

  open(name: string, attributes: Record<string, string>, parent: string): void {
    if (name === 'trkpt') {
      this.point = { lat: degrees(attributes.lat), lon: degrees(attributes.lon), time: null };
    } else if (name === 'trk' && parent === 'gpx') {
      this.track = emptyTrack();
      this.name = null;
    } else if (name === 'rte' && parent === 'gpx') this.routes += 1;
    else if (name === 'wpt' && parent === 'gpx') this.waypoints += 1;
  }

  close(name: string, text: string, parent: string): void {
    if (name === 'time' && parent === 'trkpt' && this.point) this.point.time = fileTime(text);
    else if (name === 'trkpt') this.addPoint();
    else if (name === 'trkseg') this.track.meter.breakSegment();
    else if (name === 'type' && parent === 'trk') this.track.sport = text || null;
    else if (name === 'name' && parent === 'trk') this.name = text;
    else if (name === 'trk' && parent === 'gpx') this.endTrack();
  }

  private addPoint(): void {
    const { point, track } = this;
    this.point = null;
    if (!point || !onEarth(point.lat, point.lon)) return;
    track.start ??= point.time;
    track.meter.add(point.lat, point.lon, point.time?.time ?? null);
  }

  /** Joins the track to the one before it where they are one ride: same sport and no long gap. */
  private endTrack(): void {
    const { track } = this;
    if (track.meter.points === 0) return;
    if (isCycling(track.sport) === null) track.sport = sportInName(this.name);
    const last = this.tracks.at(-1);
    if (!last || last.sport !== track.sport || apart(last, track)) {
      this.tracks.push(track);
      return;
    }
    last.meter.join(track.meter);
    last.start ??= track.start;
  }
}

const emptyTrack = (): GpxTrack => ({ meter: new TrackMeter(), sport: null, start: null });
const degrees = (text: string | undefined) => (text === undefined || text.trim() === '' ? NaN : Number(text));

function apart(last: GpxTrack, next: GpxTrack): boolean {
  const [end, start] = [last.meter.lastTime, next.meter.firstTime];
  return end !== null && start !== null && Math.abs(start - end) > NEW_RIDE_AFTER_MS;
}
