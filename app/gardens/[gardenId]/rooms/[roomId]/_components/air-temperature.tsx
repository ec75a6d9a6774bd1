'use client';

import { scaleLinear } from 'd3-scale';
import { curveMonotoneX, line, area } from 'd3-shape';
import { useWidth } from '@/app/_components/chart/use-width';
import { Choice } from '@/app/_components/choice';
import { QuantityField } from '@/app/_components/quantity-field';
import { useUnits } from '@/app/_components/units-context';
import { formatQuantity } from '@/lib/format/quantity';
import type { Room } from '@/lib/rooms/room.schema';
import type { RoomPartProps } from './room-view';

type Series = Room['climate']['airTempC'];

const MONTHS = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'];
/** What a cellar's air swings from day to night when nobody has looked. */
const USUAL_SWING_K = 3;
const HEIGHT = 150;

export function AirTemperature({ room, change, readOnly }: RoomPartProps) {
  const series = room.climate.airTempC;
  const put = (airTempC: Series) => change({ climate: { ...room.climate, airTempC } });
  const swing = series.kind === 'monthly' ? series.dailySwingK : undefined;
  return (
    <section className="grid grid-cols-1 gap-x-6 gap-y-4 pt-10 lg:grid-cols-[196px_minmax(0,1fr)] xl:grid-cols-[196px_minmax(0,1fr)_160px]">
      <div>
        <h2 className="text-14 font-semibold">Air temperature</h2>
        <p className="pb-2 text-12 text-ink-soft">
          {series.kind === 'constant' ? 'the same all year' : 'mean of each month'}
        </p>
        <Choice
          label="How it is known"
          hideLabel
          layout="column"
          disabled={readOnly}
          value={series.kind === 'hourly' ? null : series.kind}
          options={[
            { value: 'constant', label: 'Constant' },
            { value: 'monthly', label: 'Twelve months' },
          ]}
          onChange={(kind) => {
            const mean =
              series.kind === 'constant'
                ? series.value
                : series.values.reduce((sum, value) => sum + value, 0) / series.values.length;
            const rounded = Math.round(mean * 10) / 10;
            put(
              kind === 'constant'
                ? { kind, value: rounded }
                : { kind, values: Array.from({ length: 12 }, () => rounded) },
            );
          }}
        />
      </div>
      {series.kind === 'monthly' ? (
        <Months
          values={series.values}
          swingK={swing ?? 0}
          readOnly={readOnly}
          put={(values) => put({ ...series, values })}
        />
      ) : (
        <QuantityField
          label="All year"
          kind="temperature"
          step={0.1}
          min={-40}
          max={60}
          value={series.kind === 'constant' ? series.value : 0}
          disabled={readOnly || series.kind === 'hourly'}
          hint="60 F works too. The coldest hours decide the heater: put the coldest, if you know only one."
          onCommit={(value) => put({ kind: 'constant', value })}
        />
      )}
      {series.kind === 'monthly' && (
        <QuantityField
          label="Between day and night"
          kind="temperatureDifference"
          step={0.1}
          min={0}
          max={40}
          className="w-40"
          value={swing ?? USUAL_SWING_K}
          isDefault={swing === undefined}
          defaultReason="Cellars swing 1 to 5 K; left open, none is counted."
          onConfirmDefault={() => put({ ...series, dailySwingK: USUAL_SWING_K })}
          disabled={readOnly}
          onCommit={(dailySwingK) => put({ ...series, dailySwingK })}
        />
      )}
    </section>
  );
}

interface MonthsProps {
  values: number[];
  swingK: number;
  readOnly: boolean;
  put: (values: number[]) => void;
}

function Months({ values, swingK, readOnly, put }: MonthsProps) {
  const units = useUnits();
  const [ref, widthPx] = useWidth<HTMLDivElement>(860);
  const column = widthPx / 12;
  const low = Math.min(...values) - swingK / 2;
  const high = Math.max(...values) + swingK / 2;
  const y = scaleLinear()
    .domain([Math.floor(low - 1), Math.ceil(high + 1)])
    .range([HEIGHT - 6, 10]);
  const x = (at: number) => (at + 0.5) * column;
  const curve = line<number>(
    (_, at) => x(at),
    (value) => y(value),
  ).curve(curveMonotoneX);
  const band = area<number>(
    (_, at) => x(at),
    (value) => y(value - swingK / 2),
    (value) => y(value + swingK / 2),
  ).curve(curveMonotoneX);
  return (
    <div className="min-w-0">
      <div ref={ref} className="max-md:hidden">
        <svg
          width={widthPx}
          height={HEIGHT}
          className="block"
          role="img"
          aria-label={`Air temperature by month: ${values.map((value, at) => `${MONTHS[at]} ${formatQuantity(value, 'temperature', units).text}`).join(', ')}`}
        >
          {y.ticks(4).map((tick) => (
            <g key={tick}>
              <line x1="0" x2={widthPx} y1={y(tick)} y2={y(tick)} stroke="var(--line)" />
              <text x="0" y={y(tick) - 3} fontSize="12" fill="var(--ink-soft)">
                {formatQuantity(tick, 'temperature', units, { digits: 0 }).text}
              </text>
            </g>
          ))}
          {swingK > 0 && (
            <path
              d={band(values) ?? ''}
              fill="var(--frost)"
              fillOpacity="0.12"
              stroke="var(--frost)"
              strokeDasharray="3 3"
              strokeWidth="0.75"
            />
          )}
          <path d={curve(values) ?? ''} fill="none" stroke="var(--frost)" strokeWidth="2" />
          {values.map((value, at) => (
            <g key={at}>
              <line x1={x(at)} x2={x(at)} y1={y(value) + 6} y2={HEIGHT} stroke="var(--hatch)" strokeDasharray="1 3" />
              <circle cx={x(at)} cy={y(value)} r="4" fill="var(--paper)" stroke="var(--frost)" strokeWidth="1.5" />
            </g>
          ))}
        </svg>
      </div>
      <div className="grid grid-cols-3 gap-x-1 gap-y-2 sm:grid-cols-4 md:grid-cols-12">
        {values.map((value, at) => (
          <QuantityField
            key={at}
            label={MONTHS[at]!}
            kind="temperature"
            step={0.1}
            min={-40}
            max={60}
            className="w-full"
            unit=""
            value={value}
            disabled={readOnly}
            onCommit={(next) => put(values.map((each, index) => (index === at ? next : each)))}
          />
        ))}
      </div>
      <p className="pt-2 text-12 text-ink-soft">
        In {formatQuantity(0, 'temperature', units).unit}. Up and down keys change a month by 0.1 K, with Shift by 1 K.
        60 F works too.
      </p>
    </div>
  );
}
