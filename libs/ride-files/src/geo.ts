/** Mean radius of the earth in metres (IUGG: 6 371.0088 km; memory). */
const EARTH_RADIUS_M = 6_371_008.8;
const radians = (degrees: number) => (degrees * Math.PI) / 180;

/** Great-circle distance in metres between two points in degrees, by the haversine formula. */
export function haversineM(latA: number, lonA: number, latB: number, lonB: number): number {
  const dLat = radians(latB - latA);
  const dLon = radians(lonB - lonA);
  const h =
    Math.sin(dLat / 2) ** 2 + Math.cos(radians(latA)) * Math.cos(radians(latB)) * Math.sin(dLon / 2) ** 2;
  return 2 * EARTH_RADIUS_M * Math.asin(Math.min(1, Math.sqrt(h)));
}

/** True for a latitude and longitude that exist. */
export function onEarth(lat: number, lon: number): boolean {
  return Number.isFinite(lat) && Number.isFinite(lon) && Math.abs(lat) <= 90 && Math.abs(lon) <= 180;
}
