import { StandingMark, standingWords, type ShownStanding } from '@/app/_components/standing-mark';
import type { TableRow } from '@/app/_components/table-behind';
import type { CropFigure } from '@/lib/crops/crop.schema';
import { defaults } from '@/lib/evaluation/evaluate-scenario';
import { sources } from '@/lib/reference-data/physics-sources';
import type { referenceData } from '@/lib/reference-data/reference-data';

type Reference = ReturnType<typeof referenceData>;

export function physicsSources(): TableRow[] {
  return Object.values(sources).map(({ citation, standing }) => ({
    work: <span className="font-normal">{citation}</span>,
    standing: <StandingMark standing={standing} />,
  }));
}

/** A path of a plan in words: `tent.liningReflectanceFrac` is the tent's lining reflectance. */
function pathWords(path: string): string {
  return path
    .replace(/(UWM2K|WM2K|Frac|Pct|KgH|M3H|TempC|Deg|Ach|W|M|K|H|L|A|V)$/, '')
    .replaceAll(/([a-z])([A-Z])/g, '$1 $2')
    .replaceAll('.', ': ')
    .toLowerCase();
}

export function defaultRows(): TableRow[] {
  return Object.entries(defaults).map(([path, each]) => ({
    what: <span className="font-normal">{pathWords(path)}</span>,
    value: String(each.value).replace('-', '−'),
    unit: each.unit,
    why: each.why,
    standing: <StandingMark standing={each.standing} />,
  }));
}

/** Every work behind a crop's figure, with how many figures rest on it and how they are known. */
export function cropSources({ crops }: Reference): TableRow[] {
  const works = new Map<string, { citation: string; standings: Map<ShownStanding, number> }>();
  const all: CropFigure[] = crops.flatMap((crop) => Object.values(crop.figures).flat());
  for (const figure of all) {
    const work = works.get(figure.sourceKey) ?? { citation: figure.source, standings: new Map() };
    work.standings.set(figure.standing, (work.standings.get(figure.standing) ?? 0) + 1);
    works.set(figure.sourceKey, work);
  }
  return [...works.values()]
    .sort((a, b) => a.citation.localeCompare(b.citation))
    .map(({ citation, standings }) => ({
      work: <span className="font-normal">{citation}</span>,
      figures: String([...standings.values()].reduce((sum, count) => sum + count, 0)),
      standing: (
        <>
          {[...standings].map(([standing, count]) => (
            <span key={standing} className="block">
              <StandingMark standing={standing} word={false} /> {standingWords[standing]}
              {standings.size > 1 ? ` ${count}` : ''}
            </span>
          ))}
        </>
      ),
    }));
}

export function priceSources({ prices }: Reference): TableRow[] {
  const works = new Map<string, { count: number; known: Set<ShownStanding> }>();
  for (const price of prices) {
    const work = works.get(price.source) ?? { count: 0, known: new Set() };
    work.count += 1;
    work.known.add(price.standing);
    works.set(price.source, work);
  }
  return [...works].map(([source, { count, known }]) => ({
    work: <span className="font-normal">{source}</span>,
    figures: String(count),
    standing: (
      <>
        {[...known].map((standing) => (
          <span key={standing} className="block">
            <StandingMark standing={standing} />
          </span>
        ))}
      </>
    ),
  }));
}
