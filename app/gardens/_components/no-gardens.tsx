import { PageFrame } from '@/app/_components/page-frame';
import { TextLink } from '@/app/_components/link';
import { DashedTent } from './dashed-tent';

/** Before anything is there: a sentence, a picture, one button. */
export function NoGardens({ name }: { name: string }) {
  return (
    <PageFrame
      current="gardens"
      headline={`Nothing grows here yet, ${name}.`}
      lead="A garden is you and whoever grows with you: its rooms, its tents, its lamps, its bill."
    >
      <div className="pt-14 pl-55 max-lg:pl-0">
        <DashedTent tall={190} wide={128}>
          <TextLink href="/gardens/new" look="button">
            Make a garden
          </TextLink>
          <p className="pt-3 text-14 text-ink-soft">
            Somebody asked you in? <TextLink href="/gardens/join">Join with their code</TextLink>
          </p>
        </DashedTent>
      </div>
    </PageFrame>
  );
}
