import { roomSide, type RoomAir, type TentModel } from './tent-state';

/**
 * Steady temperature of a tent without heater and without plants' water: leakage and the fan's least flow only.
 *
 *   T = T_room + (G − UA_floor·(T_room − T_slab))/(UA_fabric + UA_floor + ṁ·c_p)
 *
 * @param gainW lamps, fans and pump inside
 * @returns `tempC` °C, null where nothing lets the heat out, so that no temperature is steady; `conductanceWK` W/K
 * @source energy balance
 */
export function freeFloat({ tent, room, gainW }: { tent: TentModel; room: RoomAir; gainW: number }): {
  tempC: number | null;
  conductanceWK: number;
} {
  const side = roomSide(room, tent.pressurePa);
  const airWK = (Math.max(tent.leakageM3H, tent.exhaustMinM3H) / 3600 / side.volumePerKg) * side.capacity;
  const conductanceWK = tent.fabricWK + tent.floorWK + airWK;
  if (conductanceWK === 0) return { tempC: gainW > 0 ? null : room.tempC, conductanceWK };
  const floorW = tent.floorWK * (room.tempC - room.slabTempC);
  const tempC = room.tempC + (gainW - floorW) / conductanceWK;
  // A conductance next to nothing would warm it beyond all numbers.
  return { tempC: Number.isFinite(tempC) ? tempC : null, conductanceWK };
}
