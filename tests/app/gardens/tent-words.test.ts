import { describe, expect, it } from 'vitest';
import { countWords, headlineOf, tentWords, type TentWords } from '@/app/gardens/_components/tent-words';
import { demoDocument } from '@/app/_components/demo-document';
import { evaluateScenario, type ScenarioDocument } from '@/lib/evaluation/evaluate-scenario';

const said = (doc: ScenarioDocument) => tentWords(doc, evaluateScenario(doc), 'Boiler-house tent');

describe('what a tent says on the page of gardens', () => {
  it('says first that no lamp hangs in it', () => {
    expect(said({ ...demoDocument, placements: [] }).clause).toBe('the boiler-house tent has no lamp yet');
  });

  it('says that a tier is short of light, with the figure that its page shows', () => {
    const evaluation = evaluateScenario(demoDocument);
    const lower = evaluation.tiers.find((tier) => tier.id === 'lower')!;
    const words = tentWords(demoDocument, evaluation, 'Boiler-house tent');
    expect(lower.verdict).toBe('below');
    expect(words.mark.verdict).toBe('below');
    expect(words.figure).toBe(lower.dliMolM2D.mean.toFixed(1));
    expect(words.clause).toBe('the lettuce in the boiler-house tent is short of light');
  });

  it('leaves a tent alone whose tiers are all inside their bands and which holds its climate', () => {
    const evaluation = evaluateScenario(demoDocument);
    const well = {
      ...evaluation,
      cautions: [],
      tiers: evaluation.tiers.map((tier) => ({ ...tier, verdict: 'inside' as const })),
    };
    expect(tentWords(demoDocument, well, 'Boiler-house tent').urgency).toBe(0);
  });

  it('puts an overloaded circuit before everything else', () => {
    const weak = {
      ...demoDocument,
      power: { ...demoDocument.power, circuits: [{ ...demoDocument.power.circuits[0]!, ratingA: 1 }] },
    };
    expect(said(weak).link?.page).toBe('/power');
  });
});

describe('the headline of the page of gardens', () => {
  const words = (urgency: number, clause: string): TentWords => ({
    urgency,
    clause,
    mark: { verdict: 'below', tone: 'lamp' },
    figure: null,
    sentence: '',
    link: null,
    tierId: null,
    remedy: null,
  });

  it('counts only what wants a person, the worst first', () => {
    expect(
      headlineOf([words(0, 'x'), words(4, 'the garage tent sweats'), words(7, 'the lettuce is short of light')]),
    ).toBe('Two things want you. The lettuce is short of light, and the garage tent sweats.');
    expect(headlineOf([words(0, 'x')])).toBe('All is well in the tent.');
  });

  it('counts in words', () => {
    expect(countWords(0, 'lamp', 'lamps')).toBe('no lamp');
    expect(countWords(1, 'lamp', 'lamps')).toBe('one lamp');
    expect(countWords(12, 'lamp', 'lamps')).toBe('12 lamps');
  });
});
