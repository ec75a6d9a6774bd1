import { LoadingState } from '@/app/_components/page-state';

export default function Loading() {
  return (
    <main id="main" className="px-18 max-md:px-4">
      <LoadingState what="your account" />
    </main>
  );
}
