import { LoadingState } from '@/app/_components/page-state';

export default function Loading() {
  return (
    <div className="px-11 max-md:px-4">
      <LoadingState what="the tent" />
    </div>
  );
}
