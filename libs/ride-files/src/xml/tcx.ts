import { fileTime, type FileTime } from '../day';
import { onEarth } from '../geo';
import { TrackMeter } from '../track-meter';
import type { XmlReader } from './sax';

/** One TCX activity: sums over its laps, and the span of its points. */
export interface TcxActivity {
  sport: string | null;
  start: FileTime | null;
  distanceM: number;
  timerS: number;
  laps: number;
  /** Epoch ms: end of the last lap by its own start and timer. */
  lapsEnd: number | null;
  firstPoint: number | null;
  lastPoint: number | null;
}

/** Reads TCX: activities by their lap sums; a lap that gives no distance is measured over its points. */
export class TcxReader implements XmlReader {
  readonly activities: TcxActivity[] = [];
  courses = 0;
  workouts = 0;
  private activity: TcxActivity | null = null;
  private lap = emptyLap();
  private point: { lat: number; lon: number; time: number | null } = emptyPoint();

  open(name: string, attributes: Record<string, string>): void {
    if (name === 'Activity') this.activity = emptyActivity(attributes.Sport ?? null);
    else if (name === 'Course') this.courses += 1;
    else if (name === 'Workout') this.workouts += 1;
    else if (name === 'Trackpoint') this.point = emptyPoint();
    else if (name === 'Lap' && this.activity) {
      this.lap = emptyLap();
      this.lap.start = fileTime(attributes.StartTime ?? '');
      this.activity.start ??= this.lap.start;
    }
  }

  close(name: string, text: string, parent: string): void {
    if (!this.activity) return;
    const value = Number(text);
    if (parent === 'Lap' && name === 'DistanceMeters') this.lap.distanceM = positive(value);
    else if (parent === 'Lap' && name === 'TotalTimeSeconds') this.lap.timerS = positive(value);
    else if (parent === 'Trackpoint' && name === 'Time') this.point.time = fileTime(text)?.time ?? null;
    else if (parent === 'Trackpoint' && name === 'DistanceMeters') this.lap.reach(value);
    else if (name === 'LatitudeDegrees' && parent === 'Position') this.point.lat = value;
    else if (name === 'LongitudeDegrees' && parent === 'Position') this.point.lon = value;
    else if (name === 'Trackpoint') this.endPoint(this.activity);
    else if (name === 'Track') this.lap.meter.breakSegment();
    else if (name === 'Lap') this.endLap(this.activity);
    else if (name === 'Id' && parent === 'Activity') this.activity.start ??= fileTime(text);
    else if (name === 'Activity') {
      this.activities.push(this.activity);
      this.activity = null;
    }
  }

  private endPoint(activity: TcxActivity): void {
    const { lat, lon, time } = this.point;
    if (onEarth(lat, lon)) this.lap.meter.add(lat, lon, time);
    if (time === null) return;
    activity.firstPoint = Math.min(activity.firstPoint ?? time, time);
    activity.lastPoint = Math.max(activity.lastPoint ?? time, time);
  }

  private endLap(activity: TcxActivity): void {
    const { lap } = this;
    activity.laps += 1;
    activity.timerS += lap.timerS || lap.meter.movingS;
    activity.distanceM += lap.distanceM || lap.countedM || lap.meter.distanceM;
    if (lap.start) activity.lapsEnd = lap.start.time + lap.timerS * 1000;
  }
}

const positive = (value: number) => (Number.isFinite(value) && value > 0 ? value : 0);
const emptyPoint = () => ({ lat: NaN, lon: NaN, time: null });
const emptyActivity = (sport: string | null): TcxActivity => ({
  sport,
  start: null,
  distanceM: 0,
  timerS: 0,
  laps: 0,
  lapsEnd: null,
  firstPoint: null,
  lastPoint: null,
});

/** A lap under way; countedM is how far its points' own counter went. */
function emptyLap() {
  let from: number | null = null;
  const lap = {
    start: null as FileTime | null,
    distanceM: 0,
    timerS: 0,
    countedM: 0,
    meter: new TrackMeter(),
    reach(counter: number) {
      if (!Number.isFinite(counter)) return;
      from ??= counter;
      lap.countedM = Math.max(lap.countedM, counter - from);
    },
  };
  return lap;
}
