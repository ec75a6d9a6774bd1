import { TextLink } from './_components/link';
import { PageState } from './_components/page-state';

export default function NotFound() {
  return (
    <main id="main" className="mx-auto max-w-360 px-18 pt-10 max-lg:px-8 max-md:px-4">
      <p className="text-17 font-semibold">Cellarsun</p>
      <PageState
        title="There is no such page here."
        detail="It may have been deleted, its address may be mistyped, or it belongs to a garden that you have no part in."
      >
        <TextLink href="/gardens">Go to your gardens</TextLink>
        <TextLink href="/">Draw a tent</TextLink>
      </PageState>
    </main>
  );
}
