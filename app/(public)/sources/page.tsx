import type { Metadata } from 'next';
import { PageFrame } from '@/app/_components/page-frame';
import { StandingMark, standingSentences, type ShownStanding } from '@/app/_components/standing-mark';
import { TableBehind } from '@/app/_components/table-behind';
import { getActor } from '@/lib/auth/session';
import { physicsVersion } from '@/lib/evaluation/evaluate-scenario';
import { referenceData } from '@/lib/reference-data/reference-data';
import { StrangerFrame } from '../_components/stranger-frame';
import { cropSources, defaultRows, physicsSources, priceSources } from './_components/source-rows';

export const metadata: Metadata = { title: 'Where the figures come from' };

const KEY: ShownStanding[] = ['read', 'secondary', 'computed', 'judgement', 'recalled', 'own', 'given'];
const HEADLINE = 'Every figure has a source, or says that it has none.';
const LEAD = 'Standing says how a figure is known. It is neither praise nor blame.';

export default async function SourcesPage() {
  const body = <Sources />;
  return (await getActor()) ? (
    <PageFrame crumbs={[{ words: 'Where the figures come from' }]} headline={HEADLINE} lead={LEAD}>
      {body}
    </PageFrame>
  ) : (
    <StrangerFrame headline={HEADLINE} lead={LEAD}>
      {body}
    </StrangerFrame>
  );
}

function Sources() {
  const data = referenceData();
  const standing = { key: 'standing', label: 'How it is known' };
  return (
    <div className="flex flex-col gap-8 pt-8">
      <dl className="grid grid-cols-[11rem_minmax(0,1fr)] gap-x-6 gap-y-1.5 text-14 max-md:grid-cols-1">
        {KEY.map((each) => (
          <div key={each} className="contents">
            <dt>
              <StandingMark standing={each} />
            </dt>
            <dd className="text-ink-soft max-md:pb-2">{standingSentences[each]}</dd>
          </div>
        ))}
      </dl>
      <TableBehind
        caption={`Physics, version ${physicsVersion}`}
        order="as used"
        columns={[{ key: 'work', label: 'Work' }, standing]}
        rows={physicsSources()}
      />
      <TableBehind
        opener="The defaults, taken where a plan is silent"
        caption="Defaults, taken where a plan is silent"
        columns={[
          { key: 'what', label: 'What' },
          { key: 'value', label: 'Value', align: 'right' },
          { key: 'unit', label: 'Unit' },
          { key: 'why', label: 'Why' },
          standing,
        ]}
        rows={defaultRows()}
      />
      <TableBehind
        opener="The works behind the crops"
        caption="Crops"
        columns={[{ key: 'work', label: 'Work' }, { key: 'figures', label: 'Figures', align: 'right' }, standing]}
        rows={cropSources(data)}
      />
      <TableBehind
        opener="What a kWh costs"
        caption="What a kWh costs"
        columns={[
          { key: 'work', label: 'Work' },
          { key: 'figures', label: 'Prices', align: 'right' },
          { key: 'standing', label: 'How it is known' },
        ]}
        rows={priceSources(data)}
      />
      <p className="max-w-[46rem] text-14 text-ink-soft">
        Photons for each lumen are computed from published spectra of {data.colours.length} light sources and the eye’s
        curve of 1924 (CIE 15, NIST and ASTM G173); the spread between lamps of one name stands beside each result.
      </p>
    </div>
  );
}
