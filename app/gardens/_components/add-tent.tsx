import { TextLink } from '@/app/_components/link';
import { DashedTent } from './dashed-tent';

/** The one way to add: a dashed tent on a dashed floor that belongs to no garden, with the page's only button. */
export function AddTent({ gardenId }: { gardenId: string }) {
  return (
    <DashedTent>
      <TextLink href={`/gardens/${gardenId}/tents/new`} look="button">
        Add a tent
      </TextLink>
      <p className="pt-2 text-12 text-ink-soft">It asks first where: in one of your rooms or in a new one.</p>
    </DashedTent>
  );
}
