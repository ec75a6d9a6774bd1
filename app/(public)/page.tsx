import type { Metadata, Route } from 'next';
import { redirect } from 'next/navigation';
import { demoDocument } from '@/app/_components/demo-document';
import { getActor } from '@/lib/auth/session';
import { figuresOf } from '@/lib/crops/reference-target';
import type { ScenarioDocument } from '@/lib/evaluation/evaluate-scenario';
import { referenceData } from '@/lib/reference-data/reference-data';
import { landingTariff } from '@/lib/tariffs/landing-tariff';
import { LandingTent, type LandingCrop } from './_components/landing-tent';

export const metadata: Metadata = { title: { absolute: 'Cellarsun: a tent in a cold cellar' } };

/** Crops with a daily light figure, as they are grown on: a stranger chooses a plant, not a stage. */
function landingCrops(): LandingCrop[] {
  return referenceData().crops.flatMap((stage) => {
    const figures = stage.stage === 'production' || stage.stage.startsWith('fruiting') ? figuresOf(stage) : null;
    return figures
      ? [{ crop: stage.crop, stage: stage.stage, target: { ...figures, crop: stage.crop, stage: stage.stage } }]
      : [];
  });
}

/** The example with what the reference says its crops want, and what power costs. */
function landingDocument(crops: readonly LandingCrop[]): ScenarioDocument {
  const known = (name: string | undefined) => crops.find((each) => each.crop === name)?.target;
  return {
    ...demoDocument,
    tiers: demoDocument.tiers.map((tier) => ({ ...tier, target: known(tier.target?.crop) ?? tier.target })),
    power: { ...demoDocument.power, tariff: landingTariff() },
  };
}

export default async function LandingPage() {
  if (await getActor()) redirect('/gardens' as Route);
  const crops = landingCrops();
  return <LandingTent document={landingDocument(crops)} crops={crops} />;
}
