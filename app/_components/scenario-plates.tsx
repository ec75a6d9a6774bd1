import { TextLink } from './link';

export interface ScenarioPlate {
  scenarioId: string;
  name: string;
  /** Under the name, such as "176 kWh in January". */
  fact?: string;
  /** Tops of the tiers as shares of the tent's height, for the small drawing. */
  tierHeightsFrac?: readonly number[];
}

const letterOf = (at: number) => String.fromCharCode(65 + (at % 26));

/** The scenarios of a tent, side by side, each with its letter; the open one stands on a lamp rule. */
export function ScenarioPlates({
  plates,
  current,
  hrefOf,
}: {
  plates: readonly ScenarioPlate[];
  current: string;
  hrefOf: (scenarioId: string) => string;
}) {
  return (
    <nav aria-label="Scenarios of this tent" className="flex min-w-0 flex-wrap gap-x-6">
      {plates.map((plate, at) => {
        const open = plate.scenarioId === current;
        return (
          <TextLink
            key={plate.scenarioId}
            href={hrefOf(plate.scenarioId)}
            look="quiet"
            {...(open && { 'aria-current': 'page' as const })}
            className={`flex min-h-11 items-center gap-2.5 border-b-[2.5px] pt-1.5 pb-1.5 ${open ? 'border-b-lamp' : 'border-b-transparent'}`}
          >
            <PlateDrawing tiers={plate.tierHeightsFrac ?? []} strong={open} />
            <span className="min-w-0">
              <span className={`block text-14 text-ink ${open ? 'font-semibold' : ''}`}>
                {letterOf(at)}&ensp;{plate.name}
              </span>
              {plate.fact && <span className="block text-12 text-ink-soft">{plate.fact}</span>}
            </span>
          </TextLink>
        );
      })}
    </nav>
  );
}

function PlateDrawing({ tiers, strong }: { tiers: readonly number[]; strong: boolean }) {
  return (
    <svg aria-hidden="true" viewBox="0 0 22 32" className="h-8 w-5.5 shrink-0 text-ink" fill="none">
      <rect x={1} y={1} width={20} height={30} stroke="currentColor" strokeWidth={strong ? 2 : 1} />
      {tiers.map((height, at) => (
        <path key={at} d={`M4 ${(31 - height * 30).toFixed(1)}h14`} stroke="currentColor" strokeWidth={1.5} />
      ))}
    </svg>
  );
}
