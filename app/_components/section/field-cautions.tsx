import type { Evaluation } from '@/lib/evaluation/evaluate-scenario';
import { Sentence } from '../sentence';
import { More } from './inspector';

type Caution = Evaluation['cautions'][number];

/** Under a thing's fields: the first caution in full, since it decides where the thing stands; the others a line away. */
export function FieldCautions({ cautions }: { cautions: readonly Caution[] }) {
  const [first, ...others] = cautions;
  if (!first) return null;
  const say = (caution: Caution) => (
    <p key={caution.code + caution.where} className="max-w-[26rem] text-12">
      <span className="font-semibold text-ember-ink">Caution.</span> <Sentence text={caution.text} />{' '}
      <span className="text-ink-soft">{caution.source}</span>
    </p>
  );
  return (
    <div className="mt-2 flex flex-col gap-1.5">
      {say(first)}
      {others.length > 0 && (
        <More words={`${others.length} more to read before it is plugged in`}>{others.map(say)}</More>
      )}
    </div>
  );
}
