import { getTimes } from 'suncalc';
import { requireWithin } from '../domain-error';

/** Degrees that the sun's centre stands below the horizon: at sunrise, and at the end of civil twilight. */
export type SunAltitude = 'horizon' | 'civil';

/**
 * Length of the natural day at a place and date, sunrise to sunset, or civil dawn to dusk.
 *
 * Plants see some minutes of twilight at either end; civil twilight is longer than that.
 *
 * @param dateIso YYYY-MM-DD, local
 * @returns hours; 0 and 24 where the sun stays down or up
 * @source [SUNCALC]
 * @accuracy 0.2 min of an astronomical ephemeris below the polar circles
 */
export function dayLengthH({
  latitudeDeg,
  longitudeDeg,
  dateIso,
  twilight = 'horizon',
}: {
  latitudeDeg: number;
  longitudeDeg: number;
  dateIso: string;
  twilight?: SunAltitude;
}): number {
  requireWithin({ quantity: 'latitude', value: latitudeDeg, min: -90, max: 90, unit: '°' });
  requireWithin({ quantity: 'longitude', value: longitudeDeg, min: -180, max: 180, unit: '°' });
  // Noon by the sun's own time, so that the day asked for is the one that is lit.
  const noon = new Date(Date.parse(`${dateIso}T12:00:00Z`) - (longitudeDeg / 15) * 3_600_000);
  const times = getTimes(noon, latitudeDeg, longitudeDeg);
  const [from, to] = twilight === 'civil' ? [times.dawn, times.dusk] : [times.sunrise, times.sunset];
  if (from && to) return (to.getTime() - from.getTime()) / 3_600_000;
  return times.alwaysUp ? 24 : 0;
}
