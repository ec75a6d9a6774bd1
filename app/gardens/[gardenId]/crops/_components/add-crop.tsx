'use client';

import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { z } from 'zod';
import { Button } from '@/app/_components/button';
import { RhfQuantityField } from '@/app/_components/quantity-field';
import { RhfTextField } from '@/app/_components/text-field';
import { ApiError } from '@/lib/http/api-client';
import { useCreateGardenTarget } from '@/lib/targets/target.hooks';

const schema = z.object({
  crop: z.string().trim().min(1, 'Type the crop’s name.').max(120, 'At most 120 characters.'),
  stage: z.string().trim().min(1, 'Type its stage, such as production.').max(60, 'At most 60 characters.'),
  aim: z
    .number({ error: 'Type the light it should get in a day, such as 14 mol.' })
    .min(0)
    .max(100, 'At most 100 mol.'),
});

/** A crop that no reference names; its edges follow the aim until somebody types them. */
export function AddCrop({ gardenId, onDone }: { gardenId: string; onDone: () => void }) {
  const create = useCreateGardenTarget(gardenId);
  const { control, handleSubmit, setError, formState } = useForm({
    resolver: zodResolver(schema),
    defaultValues: { crop: '', stage: 'production', aim: undefined as unknown as number },
  });
  const submit = handleSubmit(async ({ crop, stage, aim }) => {
    try {
      await create.mutateAsync({ crop, stage, figures: { dliTargetMolM2D: aim } });
      onDone();
    } catch (error) {
      const clash = error instanceof ApiError && error.status === 409;
      setError('crop', {
        message: clash
          ? 'This garden has a target for this crop and stage already. Open its row.'
          : 'It could not be saved just now. What you typed is kept.',
      });
    }
  });
  return (
    <form
      method="post"
      onSubmit={submit}
      noValidate
      className="flex flex-wrap items-start gap-4 border-t border-line py-4"
    >
      <RhfTextField control={control} name="crop" label="Crop" autoFocus />
      <RhfTextField control={control} name="stage" label="Stage" className="w-40" />
      <RhfQuantityField control={control} name="aim" label="Light in a day, the aim" kind="dli" className="w-40" />
      <div className="flex items-center gap-4 pt-4">
        <Button type="submit" busy={formState.isSubmitting && 'Adding it'}>
          Add this crop
        </Button>
        <Button look="plain" onClick={onDone}>
          Leave it
        </Button>
      </div>
    </form>
  );
}
