import type { RideFileResult } from '../types';
import { UnreadableFile } from '../unreadable';
import { GpxReader } from './gpx';
import { gpxResults } from './gpx-results';
import { streamXml } from './sax';
import { TcxReader } from './tcx';
import { tcxResults } from './tcx-results';

/**
 * Reads GPX or TCX, told apart by the root element.
 * @throws UnreadableFile with a plain sentence
 */
export async function readXml(file: string, bytes: Uint8Array, timeZone?: string): Promise<RideFileResult[]> {
  const gpx = new GpxReader();
  const tcx = new TcxReader();
  let format = '';
  await streamXml(bytes, (root) => {
    format = root;
    if (root === 'gpx') return gpx;
    if (root === 'TrainingCenterDatabase') return tcx;
    throw new UnreadableFile(
      `The file is XML of another kind (“${root.slice(0, 40)}”): send GPX, TCX, FIT or CSV.`,
    );
  });
  return format === 'gpx' ? gpxResults(gpx, file, timeZone) : tcxResults(tcx, file, timeZone);
}
