import { requireWithin } from '../domain-error';

/** Seconds in an hour, and micromoles in a mole: 1 µmol/m²/s for an hour is this many mol/m². */
const MOL_PER_UMOL_S_H = 0.0036;

/** Daily light integral of a steady PPFD, DLI = PPFD·h·0.0036. @param hours 0…24 @returns mol/m²/d @source [S640] */
export function dliOf({ ppfdUmolM2S, hours }: { ppfdUmolM2S: number; hours: number }): number {
  requireWithin({ quantity: 'PPFD', value: ppfdUmolM2S, min: 0, max: Infinity, unit: 'µmol/m²/s' });
  requireWithin({ quantity: 'hours of light', value: hours, min: 0, max: 24, unit: 'h' });
  return ppfdUmolM2S * hours * MOL_PER_UMOL_S_H;
}

/** The PPFD that gives a DLI in so many hours. @param hours above 0 @returns µmol/m²/s */
export function ppfdFor({ dliMolM2D, hours }: { dliMolM2D: number; hours: number }): number {
  requireWithin({ quantity: 'DLI', value: dliMolM2D, min: 0, max: Infinity, unit: 'mol/m²/d' });
  requireWithin({ quantity: 'hours of light', value: hours, min: 1e-9, max: 24, unit: 'h' });
  return dliMolM2D / (hours * MOL_PER_UMOL_S_H);
}

/** The hours in which a PPFD gives a DLI; more than 24 when no day is long enough. */
export function hoursFor({ dliMolM2D, ppfdUmolM2S }: { dliMolM2D: number; ppfdUmolM2S: number }): number {
  requireWithin({ quantity: 'PPFD', value: ppfdUmolM2S, min: 1e-9, max: Infinity, unit: 'µmol/m²/s' });
  return dliMolM2D / (ppfdUmolM2S * MOL_PER_UMOL_S_H);
}
