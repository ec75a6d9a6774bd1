import type { Metadata } from 'next';
import { can } from '@/lib/auth/permissions';
import { listCrops } from '@/lib/crops/crop.service';
import { inGardenScenarioCrops } from '@/lib/scenarios/grown-crops.service';
import { getGarden } from '@/lib/gardens/garden.service';
import { pageGardenActor } from '@/lib/http/page-access';
import { listTargets } from '@/lib/targets/target.service';
import { CropsView } from './_components/crops-view';

export const metadata: Metadata = { title: 'Crops' };

export default async function CropsPage({ params }: { params: Promise<{ gardenId: string }> }) {
  const { gardenId } = await params;
  const actor = await pageGardenActor(gardenId);
  const [garden, targets, grown] = await Promise.all([
    getGarden(actor),
    listTargets(actor),
    inGardenScenarioCrops(actor),
  ]);
  return (
    <CropsView
      garden={garden}
      crops={listCrops()}
      targets={targets}
      grown={grown}
      mayEdit={can(actor.role, 'target.update')}
    />
  );
}
