'use client';

import { scaleLinear } from 'd3-scale';
import { patternFill, Patterns } from '@/app/_components/chart/patterns';
import { useWidth } from '@/app/_components/chart/use-width';
import { QuantityField } from '@/app/_components/quantity-field';
import { SelectField } from '@/app/_components/select-field';
import { TextField } from '@/app/_components/text-field';
import type { Tariff } from '@/lib/evaluation/evaluate-scenario';
import { useState } from 'react';

type Hourly = Extract<Tariff, { kind: 'timeOfUse' }>;
type Period = Hourly['periods'][number];

interface HourlyPricesProps {
  tariff: Hourly;
  put: (tariff: Hourly) => void;
  readOnly: boolean;
  currency: string;
}

const SEASONS = {
  all: { label: 'All year', months: undefined },
  winter: { label: 'October to March', months: [1, 2, 3, 10, 11, 12] },
  summer: { label: 'April to September', months: [4, 5, 6, 7, 8, 9] },
} as const;

const seasonOf = (months: number[] | undefined): keyof typeof SEASONS | 'other' => {
  if (!months || months.length === 12) return 'all';
  const text = [...months].sort((a, b) => a - b).join();
  return text === SEASONS.winter.months.join() ? 'winter' : text === SEASONS.summer.months.join() ? 'summer' : 'other';
};

const minutes = (clock: string) => {
  const [h = 0, m = 0] = clock.split(':').map(Number);
  return h * 60 + m;
};

/** A winter weekday's prices through the day, and the bands that make them. */
export function HourlyPrices({ tariff, put, readOnly, currency }: HourlyPricesProps) {
  const edit = (at: number, patch: Partial<Period>) =>
    put({
      ...tariff,
      periods: tariff.periods.map((period, index) => (index === at ? { ...period, ...patch } : period)),
    });
  return (
    <div className="pt-4">
      <DayOfPrices tariff={tariff} />
      <div className="flex flex-col gap-4 pt-4">
        <QuantityField
          label="Usually"
          kind="ratio"
          unit={currency}
          min={-10}
          max={1000}
          value={tariff.otherwise}
          disabled={readOnly}
          onCommit={(otherwise) => put({ ...tariff, otherwise })}
        />
        {tariff.periods.map((period, at) => (
          <div key={at} className="flex flex-wrap items-start gap-3 border-t border-line pt-3">
            <QuantityField
              label="Price"
              kind="ratio"
              unit={currency}
              className="w-32"
              min={-10}
              max={1000}
              value={period.price}
              disabled={readOnly}
              onCommit={(price) => edit(at, { price })}
            />
            <Clock label="From" value={period.from} disabled={readOnly} put={(from) => edit(at, { from })} />
            <Clock label="To" value={period.to} disabled={readOnly} put={(to) => edit(at, { to })} end />
            <SelectField
              label="On"
              className="w-36"
              value={period.weekdays ?? 'all'}
              disabled={readOnly}
              options={[
                { value: 'all', label: 'Every day' },
                { value: 'weekday', label: 'Weekdays' },
                { value: 'weekend', label: 'Weekends' },
              ]}
              onChange={(weekdays) => edit(at, { weekdays: weekdays as Period['weekdays'] })}
            />
            <SelectField
              label="In"
              className="w-48"
              value={seasonOf(period.months)}
              disabled={readOnly}
              options={[
                ...Object.entries(SEASONS).map(([value, { label }]) => ({ value, label })),
                { value: 'other', label: 'Other months', disabled: true },
              ]}
              onChange={(season) => {
                const { months: _, ...rest } = period;
                const months = SEASONS[season as keyof typeof SEASONS].months;
                put({
                  ...tariff,
                  periods: tariff.periods.map((each, index) =>
                    index === at ? { ...rest, ...(months && { months: [...months] }) } : each,
                  ),
                });
              }}
            />
            {!readOnly && (
              <button
                type="button"
                className="link-opens mt-5 min-h-6 text-12"
                onClick={() => put({ ...tariff, periods: tariff.periods.filter((_, index) => index !== at) })}
              >
                Take it out
              </button>
            )}
          </div>
        ))}
      </div>
      {!readOnly && (
        <button
          type="button"
          className="link-does mt-3 min-h-6 text-14"
          onClick={() =>
            put({ ...tariff, periods: [...tariff.periods, { price: tariff.otherwise, from: '07:00', to: '11:00' }] })
          }
        >
          Add an hour band
        </button>
      )}
      <p className="pt-2 text-12 text-ink-soft">
        The first band that fits counts; a band may run through midnight. Hours are those of the wall clock.
      </p>
    </div>
  );
}

interface ClockProps {
  label: string;
  value: string;
  disabled: boolean;
  put: (value: string) => void;
  end?: boolean;
}

function Clock({ label, value, disabled, put, end }: ClockProps) {
  const [text, setText] = useState(value);
  const plain = text
    .trim()
    .replace(/^(\d):/, '0$1:')
    .replace(/^(\d{1,2})$/, (hour) => `${hour.padStart(2, '0')}:00`);
  const fits = /^([01]\d|2[0-3]):[0-5]\d$/.test(plain) || (end === true && plain === '24:00');
  return (
    <TextField
      label={label}
      className="w-24"
      value={text}
      disabled={disabled}
      error={fits ? undefined : 'Type a time such as 17:00.'}
      onChange={setText}
      onBlur={() => {
        if (!fits) return;
        setText(plain);
        if (plain !== value) put(plain);
      }}
    />
  );
}

function DayOfPrices({ tariff }: { tariff: Hourly }) {
  const [ref, widthPx] = useWidth<HTMLDivElement>(856);
  const priceAt = (minute: number) =>
    tariff.periods.find((period) => {
      if (period.weekdays === 'weekend' || (period.months && !period.months.includes(1))) return false;
      const [from, to] = [minutes(period.from), minutes(period.to)];
      return from < to ? minute >= from && minute < to : from === to || minute >= from || minute < to;
    })?.price ?? tariff.otherwise;
  const cuts = [
    ...new Set([0, 1440, ...tariff.periods.flatMap((period) => [minutes(period.from), minutes(period.to)])]),
  ].sort((a, b) => a - b);
  const spans = cuts.slice(1).map((to, at) => ({ from: cuts[at]!, to, price: priceAt((cuts[at]! + to) / 2) }));
  const most = Math.max(0.01, ...spans.map((span) => span.price));
  const x = scaleLinear().domain([0, 1440]).range([0, widthPx]);
  const y = scaleLinear()
    .domain([0, most * 1.2])
    .range([78, 16]);
  return (
    <div ref={ref} className="overflow-hidden">
      <svg
        width={widthPx}
        height="100"
        className="block"
        role="img"
        aria-label={`A winter weekday: ${spans.map((span) => `${span.price} from ${String(Math.floor(span.from / 60)).padStart(2, '0')}:${String(span.from % 60).padStart(2, '0')}`).join(', ')}`}
      >
        <Patterns prefix="prices" />
        {spans.map((span) => (
          <g key={span.from}>
            <rect
              x={x(span.from)}
              y={y(Math.max(0, span.price))}
              width={x(span.to) - x(span.from)}
              height={78 - y(Math.max(0, span.price))}
              fill={
                span.price > tariff.otherwise
                  ? patternFill('prices', 'dear')
                  : 'color-mix(in srgb, var(--slate) 16%, var(--paper))'
              }
              stroke="var(--slate)"
            />
            {x(span.to) - x(span.from) > 34 && (
              <text
                x={(x(span.from) + x(span.to)) / 2}
                y={y(Math.max(0, span.price)) - 4}
                fontSize="12"
                textAnchor="middle"
                fill="var(--ink)"
              >
                {span.price}
              </text>
            )}
          </g>
        ))}
        {[0, 6, 12, 18, 24].map((hour) => (
          <text
            key={hour}
            x={x(hour * 60)}
            y="95"
            fontSize="12"
            textAnchor={hour === 0 ? 'start' : hour === 24 ? 'end' : 'middle'}
            fill="var(--ink-soft)"
          >
            {String(hour).padStart(2, '0')}:00
          </text>
        ))}
      </svg>
      <p className="text-12 text-ink-soft">A winter weekday; step height is price, from nothing.</p>
    </div>
  );
}
