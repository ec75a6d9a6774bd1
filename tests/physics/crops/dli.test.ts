import { describe, expect, it } from 'vitest';
import { dliOf, hoursFor, ppfdFor } from '@/physics/crops/dli';
import { photonsFromLumens } from '@/lib/fixtures/fixture-photons';
import { referenceData } from '@/lib/reference-data/reference-data';

/** Published PPFD, hours and DLI; the last column is how far the published figure is rounded or nominal. */
const rows: [number, number, number, number, string][] = [
  [38.1, 12, 1.6, 0.05, 'instrument maker’s note after Faust'],
  [1, 24, 0.0864, 1e-9, 'encyclopaedia article on the daily light integral'],
  [350, 12, 15.12, 1e-9, 'trade explainer'],
  [250, 16, 14.4, 1e-9, 'Palmitessa et al. 2026, abstract'],
  [340, 12, 14.4, 0.3, 'the same; its figure is nominal'],
  [170, 24, 14.4, 0.3, 'the same; its figure is nominal'],
  [250, 12, 10.8, 1e-9, 'tomato plug study 2024, abstract'],
  [250, 14, 12.6, 1e-9, 'tomato plug study 2024, abstract'],
  [300, 12, 12.96, 1e-9, 'tomato plug study 2024, abstract'],
  [1000, 16, 57.6, 1e-9, 'Frantz et al. 2004, hours inferred'],
  [189, 22, 15, 0.05, 'Elkins & van Iersel 2020'],
  [794, 7, 20, 0.05, 'Elkins & van Iersel 2020'],
  [240, 12, 10.4, 0.05, 'Agronomy 2022 12:1704, PPFD inferred'],
  [320, 16, 18.4, 0.05, 'Agronomy 2022 12:1704, PPFD inferred'],
  [320, 12, 13.8, 0.05, 'Agronomy 2022 12:1704, PPFD inferred'],
  [240, 16, 13.8, 0.05, 'Agronomy 2022 12:1704, PPFD inferred'],
  [200, 16, 11.5, 0.05, 'Dou et al. 2018, PPFD recalled'],
  [224, 16, 12.9, 0.05, 'Dou et al. 2018, PPFD recalled'],
  [310, 16, 17.8, 0.06, 'Dou et al. 2018, PPFD recalled'],
];

describe('daily light integral', () => {
  it.each(rows)('%s µmol/m²/s for %s h is %s mol/m²/d (within %s: %s)', (ppfdUmolM2S, hours, dli, room) =>
    expect(Math.abs(dliOf({ ppfdUmolM2S, hours }) - dli)).toBeLessThanOrEqual(room),
  );
  it('averages one day at 22.5 and four at 13.13 mol to 15 (Front. Plant Sci. 2024 15:1467443)', () =>
    expect((22.5 + 4 * 13.13) / 5).toBeCloseTo(15.004, 3));
  it('has inverses: 15 mol in 22 h takes 189.4 µmol, 20 mol in 7 h 793.7 (Elkins & van Iersel 2020)', () => {
    expect(ppfdFor({ dliMolM2D: 15, hours: 22 })).toBeCloseTo(189.4, 1);
    expect(ppfdFor({ dliMolM2D: 20, hours: 7 })).toBeCloseTo(793.7, 1);
    expect(hoursFor({ dliMolM2D: 14.4, ppfdUmolM2S: 250 })).toBeCloseTo(16, 12);
  });
  it('refuses a day longer than 24 h', () =>
    expect(() => dliOf({ ppfdUmolM2S: 1, hours: 25 })).toThrow(/hours of light/));
});

describe('photons from lumens', () => {
  const { colours } = referenceData();
  const factor = (name: string) => colours.find((each) => each.name === name)!.umolPerKlm;

  // Thimijan & Heins 1983, HortScience 18:818, lux for each µmol; lamps of one name differ by some 5 %.
  it.each([
    ['CIE D65', 54],
    ['CIE FL2', 74],
    ['CIE HP1', 82],
    ['CIE A', 50],
    ['NIST Metal Halide', 71],
  ])('%s lies within 6 %% of the published %s lux for each µmol', (name, lux) =>
    expect(Math.abs(1000 / factor(name) / lux - 1)).toBeLessThan(0.06),
  );

  it('gives an 800 lm warm bulb 11.9 µmol/s', () => {
    const photons = photonsFromLumens(800, 'warm', colours);
    expect(photons.ok && photons.ppfUmolS).toBeCloseTo(11.9, 1);
  });
  it('spans CIE LED-B1 to B5 for ordinary white lamps', () => {
    for (const name of ['CIE LED-B1', 'CIE LED-B2', 'CIE LED-B3', 'CIE LED-B4', 'CIE LED-B5']) {
      const photons = photonsFromLumens(1000, 'neutral', colours);
      if (!photons.ok) throw new Error('refused');
      expect(factor(name)).toBeGreaterThan(photons.lowUmolS);
      expect(factor(name)).toBeLessThan(photons.highUmolS);
    }
  });
  it('refuses red and blue lamps, whose lumens say nothing', () =>
    expect(photonsFromLumens(800, 'redBlue', colours)).toMatchObject({ ok: false }));
});
