/** One hour of a year, as the clock on the wall says it. */
export interface LocalHour {
  /** Hours since midnight of 1 January in local standard time. */
  index: number;
  month: number;
  /** Hour of the wall clock, daylight-saving time included, 0…23. */
  wallHour: number;
  /** 0 Sunday … 6 Saturday, of the wall clock. */
  weekday: number;
}

const HOUR_MS = 3_600_000;

export const isLeapYear = (year: number): boolean => (year % 4 === 0 && year % 100 !== 0) || year % 400 === 0;
export const hoursInYear = (year: number): number => (isLeapYear(year) ? 8784 : 8760);
export const daysInMonth = (year: number, month: number): number => new Date(Date.UTC(year, month, 0)).getUTCDate();

/** Minutes that a zone's clocks are ahead of UTC at an instant. */
function offsetMin(format: Intl.DateTimeFormat, instantMs: number): number {
  const parts: Record<string, number> = {};
  for (const { type, value } of format.formatToParts(instantMs)) if (type !== 'literal') parts[type] = Number(value);
  const local = Date.UTC(
    parts['year']!,
    parts['month']! - 1,
    parts['day']!,
    parts['hour']! % 24,
    parts['minute']!,
    parts['second']!,
  );
  return Math.round((local - Math.floor(instantMs / 1000) * 1000) / 60_000);
}

const memory = new Map<string, LocalHour[]>();

/**
 * The hours of a calendar year in a time zone, daylight-saving time as the zone keeps it.
 *
 * The year begins at midnight of 1 January in standard time; series of hourly values follow that clock, timers and tariffs
 * the wall's. Offsets are asked of the zone once a day and, on days when they change, once an hour.
 *
 * @param timeZone IANA name; @param year 1900…2200
 * @source the time-zone database that the runtime carries
 */
export function localYear(timeZone: string, year: number): LocalHour[] {
  const key = `${timeZone} ${year}`;
  const known = memory.get(key);
  if (known) return known;
  const format = new Intl.DateTimeFormat('en-US', {
    timeZone,
    calendar: 'gregory',
    hourCycle: 'h23',
    year: 'numeric',
    month: 'numeric',
    day: 'numeric',
    hour: 'numeric',
    minute: 'numeric',
    second: 'numeric',
  });
  const hours = hoursInYear(year);
  const days = hours / 24;
  const utc = Date.UTC(year, 0, 1);
  const daily = Array.from({ length: days + 2 }, (_, day) => offsetMin(format, utc + (day - 1) * 24 * HOUR_MS));
  const standardMin = Math.min(...daily);
  const list: LocalHour[] = [];
  for (let index = 0; index < hours; index += 1) {
    const instant = utc + index * HOUR_MS - standardMin * 60_000;
    const day = Math.floor((instant - utc) / (24 * HOUR_MS)) + 1;
    const steady = daily[day] === daily[Math.min(daily.length - 1, day + 1)];
    const ahead = (steady ? daily[day]! : offsetMin(format, instant)) - standardMin;
    const wall = new Date(utc + index * HOUR_MS + ahead * 60_000);
    // At the edges of a southern summer the wall clock runs into the neighbouring year; the hour still belongs to this one.
    const month = wall.getUTCFullYear() < year ? 1 : wall.getUTCFullYear() > year ? 12 : wall.getUTCMonth() + 1;
    list.push({ index, month, wallHour: wall.getUTCHours(), weekday: wall.getUTCDay() });
  }
  if (memory.size > 32) memory.clear();
  memory.set(key, list);
  return list;
}
