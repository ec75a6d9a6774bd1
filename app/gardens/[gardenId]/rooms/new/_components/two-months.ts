/** A year from its coldest and its warmest month: one swing of a cosine, the warm side in the local summer. */
export function yearBetween({ coldC, warmC, south }: { coldC: number; warmC: number; south: boolean }) {
  if (Math.abs(warmC - coldC) < 0.05) return { kind: 'constant' as const, value: coldC };
  const middle = (coldC + warmC) / 2;
  const half = (warmC - coldC) / 2;
  // Under ground and behind walls the year lags: August is warmest in the north, February in the south.
  const warmest = south ? 1 : 7;
  const values = Array.from({ length: 12 }, (_, month) => {
    const value = middle + half * Math.cos(((month - warmest) * Math.PI) / 6);
    return Math.round(value * 10) / 10;
  });
  return { kind: 'monthly' as const, values };
}

/** What the device's clock says of where it is: a first guess, to be put right. */
export function placeOfClock(now = new Date()) {
  const timeZone = Intl.DateTimeFormat().resolvedOptions().timeZone;
  const january = -new Date(now.getFullYear(), 0, 1).getTimezoneOffset();
  const july = -new Date(now.getFullYear(), 6, 1).getTimezoneOffset();
  // Summer time is in force when the sun is high: that tells the half of the earth.
  const south = january > july || /^(Australia|Pacific\/Auckland|America\/(Sao|Argentina|Santiago))/.test(timeZone);
  return { timeZone, south, latitudeDeg: south ? -35 : 48, longitudeDeg: Math.min(january, july) / 4 };
}
