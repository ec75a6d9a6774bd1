import { bracketedRoot } from './bracketed-root';
import {
  stateBeside,
  tentAir,
  type RoomSide,
  type TentAir,
  type TentModel,
  type TentState,
  type WaterSource,
} from './tent-state';

/** Far beyond what a tent reaches; here the search ends, and whoever asks is told that nothing holds the temperature. */
export const COLDEST_C = -60;
export const HOTTEST_C = 150;

const tolerance = (heatW: number) => 1e-7 * Math.max(1, Math.abs(heatW));

interface Settling {
  tent: TentModel;
  room: RoomSide;
  source: WaterSource;
  /** What lamps, fans, pump and heater give. */
  heatW: number;
  lowC: number;
  highC: number;
  /** Whole air exchange; left out, it follows the humidity. */
  airflowM3H?: number | undefined;
  /** A state nearby that is known already: the search begins there. */
  from?: TentState | undefined;
}

/**
 * The state in which a tent's losses equal a heat input.
 *
 * The search steps away from the known state by what the plain conductance would ask for, which is already close, and closes in
 * from there. Where the fan would start and stop at the edge of what the room's air can dry, it is taken to run in between.
 *
 * @returns the state; one at `lowC` or `highC` where the balance lies beyond
 */
export function temperatureFor({ tent, room, source, heatW, lowC, highC, airflowM3H, from }: Settling): TentState {
  const at = (tempC: number) => stateBeside({ tent, room, air: tentAir(tent, source, tempC), airflowM3H });
  const first = from ?? at(lowC);
  if (Math.abs(first.lossW - heatW) <= tolerance(heatW)) return first;
  const colder = first.lossW > heatW;
  const end = colder ? lowC : highC;
  const exchangeWK = ((airflowM3H ?? tent.leakageM3H) / 3600 / room.volumePerKg) * room.capacity;
  const conductanceWK = tent.fabricWK + tent.floorWK + exchangeWK;
  let near = first;
  let far = first;
  let strideK = conductanceWK > 0 ? Math.abs(heatW - first.lossW) / conductanceWK + 1e-6 : Infinity;
  do {
    near = far;
    far = at(colder ? Math.max(end, near.tempC - strideK) : Math.min(end, near.tempC + strideK));
    strideK *= 2;
  } while (far.lossW > heatW === colder && far.tempC !== end);
  if (far.lossW > heatW === colder) return far;

  const [low, high] = colder ? [far, near] : [near, far];
  let last = far;
  const root = bracketedRoot(
    (tempC) => {
      last = at(tempC);
      return last.lossW - heatW;
    },
    { low: low.tempC, lowError: low.lossW - heatW, high: high.tempC, highError: high.lossW - heatW },
    tolerance(heatW),
  );
  const found = last.tempC === root ? last : at(root);
  if (Math.abs(found.lossW - heatW) <= 1e-4 * Math.max(1, Math.abs(heatW))) return found;
  const air = tentAir(tent, source, root);
  const most = Math.max(tent.leakageM3H, tent.exhaustMinM3H, tent.exhaustMaxM3H);
  const least = Math.max(tent.leakageM3H, tent.exhaustMinM3H);
  const between = airflowBetween({ tent, room, air, heatW, leastM3H: least, mostM3H: most });
  return between === null ? found : stateBeside({ tent, room, air, airflowM3H: between });
}

interface Flowing {
  tent: TentModel;
  room: RoomSide;
  air: TentAir;
  heatW: number;
}

/** The exchange between two that balances the heat at one temperature; null where neither side of it does. */
function airflowBetween({
  tent,
  room,
  air,
  heatW,
  leastM3H,
  mostM3H,
}: Flowing & { leastM3H: number; mostM3H: number }): number | null {
  const errorAt = (airflowM3H: number) => stateBeside({ tent, room, air, airflowM3H }).lossW - heatW;
  const least = errorAt(leastM3H);
  const most = errorAt(mostM3H);
  if (least > 0 === most > 0) return null;
  const rising = most > least;
  return bracketedRoot(
    (airflowM3H) => (rising ? errorAt(airflowM3H) : -errorAt(airflowM3H)),
    {
      low: leastM3H,
      lowError: rising ? least : -least,
      high: mostM3H,
      highError: rising ? most : -most,
    },
    tolerance(heatW),
  );
}

/** The exchange that keeps a tent at a temperature against a heat input; null where no exchange can, for the room is as warm. */
export function airflowFor({ tent, room, air, heatW }: Flowing): number | null {
  const usual = stateBeside({ tent, room, air });
  if (usual.lossW >= heatW) return usual.airflowM3H;
  if (air.tempC - room.tempC < 1e-9) return null;
  let least = usual.airflowM3H;
  let most = Math.max(100, 2 * least);
  while (stateBeside({ tent, room, air, airflowM3H: most }).lossW < heatW) {
    least = most;
    most *= 4;
    if (most > 1e9) return null;
  }
  return airflowBetween({ tent, room, air, heatW, leastM3H: least, mostM3H: most });
}
