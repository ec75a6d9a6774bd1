import { LoadingState } from '@/app/_components/page-state';

export default function Loading() {
  return (
    <main id="main" className="mx-auto max-w-360 px-18 max-lg:px-8 max-md:px-4">
      <LoadingState what="the garden" />
    </main>
  );
}
