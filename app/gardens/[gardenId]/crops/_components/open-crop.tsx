'use client';

import { useState } from 'react';
import { Button } from '@/app/_components/button';
import { QuantityField } from '@/app/_components/quantity-field';
import { StandingMark } from '@/app/_components/standing-mark';
import type { TargetFigures } from '@/lib/crops/crop.schema';
import { figuresOf } from '@/lib/crops/reference-target';
import { ApiError } from '@/lib/http/api-client';
import { useCreateGardenTarget, useDeleteGardenTarget, useUpdateGardenTarget } from '@/lib/targets/target.hooks';
import { Band } from './band';
import { gapBetween, type CropRow } from './crop-rows';

interface OpenCropProps {
  gardenId: string;
  row: CropRow;
  most: number;
  widthPx: number;
  mayEdit: boolean;
}

/** An open crop: every source on the same scale, where they do not meet, and the garden's own target. */
export function OpenCrop({ gardenId, row, most, widthPx, mayEdit }: OpenCropProps) {
  const gap = gapBetween(row.sources);
  return (
    <div className="border-l-[3px] border-lamp pb-4 pl-4">
      {gap && (
        <p className="pb-2 text-14">
          <span className="font-semibold">Two that were read do not meet.</span> One ends at {gap.low} mol, the next
          begins at {gap.high}. The first row is used; set your own to decide otherwise.
        </p>
      )}
      {row.reference?.response && <p className="pb-2 text-12 text-ink-soft">Day length: {row.reference.response}</p>}
      <ul>
        {row.sources.map((figure, at) => (
          <li key={at} className="flex flex-wrap items-center gap-x-6 border-t border-line py-1.5">
            <Band
              low={figure.low}
              high={figure.high}
              aim={figure.target}
              most={most}
              widthPx={widthPx}
              tone="ink"
              dashed={figure.standing === 'recalled'}
            />
            <span className="min-w-0 flex-1 basis-64 text-12">
              <StandingMark standing={figure.standing} /> <span className="text-ink-soft">{figure.source}</span>
              {figure.unit !== 'mol/m²/d' && <span className="text-ink-soft"> ({figure.unit})</span>}
            </span>
          </li>
        ))}
      </ul>
      <OwnTarget gardenId={gardenId} row={row} mayEdit={mayEdit} />
    </div>
  );
}

function OwnTarget({ gardenId, row, mayEdit }: Pick<OpenCropProps, 'gardenId' | 'row' | 'mayEdit'>) {
  const create = useCreateGardenTarget(gardenId);
  const update = useUpdateGardenTarget(gardenId);
  const remove = useDeleteGardenTarget(gardenId);
  const [problem, setProblem] = useState<string | null>(null);
  const figures: TargetFigures = row.own?.figures ??
    (row.reference && figuresOf(row.reference)) ?? { dliTargetMolM2D: 12 };
  const run = async (work: Promise<unknown>) => {
    try {
      setProblem(null);
      await work;
    } catch (error) {
      setProblem(
        error instanceof ApiError
          ? (error.problem.problems?.[0]?.message ?? error.problem.detail ?? error.problem.title)
          : 'It could not be saved just now; nothing changed.',
      );
    }
  };
  const put = (patch: Partial<TargetFigures>) => {
    const next = { ...figures, ...patch };
    return run(
      row.own
        ? update.mutateAsync({ targetId: row.own.targetId, version: row.own.version, figures: next })
        : create.mutateAsync({ crop: row.crop, stage: row.stage, figures: next }),
    );
  };
  return (
    <div className="border-t border-line pt-3">
      <p className="text-14">
        {row.own ? (
          <>
            <StandingMark standing="own" word={false} /> <span className="font-semibold">Our own target</span> is used
            in every tent of this garden instead of the band above.
          </>
        ) : (
          <span className="font-semibold">Set a target of your own</span>
        )}
      </p>
      <div className="flex flex-wrap gap-4 pt-2">
        <QuantityField
          label="Least"
          kind="dli"
          className="w-28"
          min={0}
          max={100}
          value={figures.dliLowMolM2D ?? null}
          disabled={!mayEdit}
          onCommit={(dliLowMolM2D) => void put({ dliLowMolM2D })}
        />
        <QuantityField
          label="Aim"
          kind="dli"
          className="w-28"
          min={0}
          max={100}
          value={figures.dliTargetMolM2D}
          disabled={!mayEdit}
          onCommit={(dliTargetMolM2D) => void put({ dliTargetMolM2D })}
        />
        <QuantityField
          label="Most"
          kind="dli"
          className="w-28"
          min={0}
          max={100}
          value={figures.dliHighMolM2D ?? null}
          disabled={!mayEdit}
          onCommit={(dliHighMolM2D) => void put({ dliHighMolM2D })}
        />
        <QuantityField
          label="Light, at least"
          kind="hours"
          className="w-28"
          min={0}
          max={24}
          value={figures.photoperiodMinH ?? null}
          disabled={!mayEdit}
          onCommit={(photoperiodMinH) => void put({ photoperiodMinH })}
        />
        <QuantityField
          label="Light, at most"
          kind="hours"
          className="w-28"
          min={0}
          max={24}
          value={figures.photoperiodMaxH ?? null}
          disabled={!mayEdit}
          onCommit={(photoperiodMaxH) => void put({ photoperiodMaxH })}
        />
      </div>
      <p role="alert" className="pt-1 text-14 font-semibold text-ember-ink">
        {problem}
      </p>
      {!mayEdit && <p className="pt-1 text-12 text-ink-soft">A planner or an owner of the garden sets targets.</p>}
      {row.own && mayEdit && (
        <Button
          look="plain"
          busy={remove.isPending && 'Going back'}
          onClick={() => void run(remove.mutateAsync(row.own!.targetId))}
        >
          {row.reference ? 'Go back to the reference' : 'Delete this crop'}
        </Button>
      )}
    </div>
  );
}
