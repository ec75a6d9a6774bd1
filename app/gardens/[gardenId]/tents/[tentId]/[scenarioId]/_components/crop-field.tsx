'use client';

import { useMemo } from 'react';
import { SelectField } from '@/app/_components/select-field';
import { TextLink } from '@/app/_components/link';
import { StandingMark } from '@/app/_components/standing-mark';
import { targetKey, type ResolvedTarget, type TargetRef } from '@/lib/crops/crop.schema';
import { figuresOf } from '@/lib/crops/reference-target';
import { useGardenTargets } from '@/lib/targets/target.hooks';
import { useCropReference } from './use-scenario-document';

interface CropFieldProps {
  gardenId: string;
  chosen: TargetRef | null;
  target: ResolvedTarget | undefined;
  disabled: boolean;
  onChoose: (ref: TargetRef | null) => void;
}

const NONE = '';

/** Who says so, without the whole citation: that stands on the crops page. */
function shortSource(source: string): string {
  const head = source.split(/[,.(:]/)[0]!.trim();
  return head.length > 40 ? `${head.slice(0, 39)}…` : `${head}.`;
}

/** Crop first, then its stage; the garden's own crops stand among those of the reference. */
export function CropField({ gardenId, chosen, target, disabled, onChoose }: CropFieldProps) {
  const reference = useCropReference();
  const own = useGardenTargets(gardenId).data;
  const stages = useMemo(() => {
    const found = new Map<string, string[]>();
    const add = (crop: string, stage: string) => {
      const list = found.get(crop) ?? [];
      if (!list.includes(stage)) found.set(crop, [...list, stage]);
    };
    for (const entry of reference ?? []) if (figuresOf(entry)) add(entry.crop, entry.stage);
    for (const entry of own ?? []) add(entry.crop, entry.stage);
    if (chosen) add(chosen.crop, chosen.stage);
    return new Map([...found].sort(([a], [b]) => a.localeCompare(b)));
  }, [reference, own, chosen]);
  const stageNames = chosen ? (stages.get(chosen.crop) ?? []) : [];
  const usual = (crop: string) => {
    const list = stages.get(crop) ?? [];
    return list.find((stage) => stage === chosen?.stage) ?? list.find((stage) => stage === 'production') ?? list[0]!;
  };
  return (
    <>
      <SelectField
        label="What grows here"
        value={chosen?.crop ?? NONE}
        disabled={disabled}
        options={[
          { value: NONE, label: 'Nothing yet' },
          ...[...stages.keys()].map((crop) => ({ value: crop, label: crop })),
        ]}
        onChange={(crop) => onChoose(crop === NONE ? null : { crop, stage: usual(crop) })}
      />
      {chosen && stageNames.length > 1 && (
        <SelectField
          label="Its stage"
          value={chosen.stage}
          disabled={disabled}
          options={stageNames.map((stage) => ({ value: stage, label: stage }))}
          onChange={(stage) => onChoose({ crop: chosen.crop, stage })}
        />
      )}
      {chosen && (
        <p className="text-12 text-ink-soft" key={targetKey(chosen)}>
          {target ? (
            <>
              <StandingMark standing={target.standing} />: {shortSource(target.source)}{' '}
            </>
          ) : (
            'No light is known for this stage yet. '
          )}
          <TextLink href={`/gardens/${gardenId}/crops`} look="opens">
            Its figures, and our own
          </TextLink>
        </p>
      )}
    </>
  );
}
