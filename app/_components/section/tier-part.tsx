/** A shelf cut open, its plants, and the strip of light beneath it. */
import { rampVar } from '../ppfd-ramp';
import { bandPpfd, stripBand, stripCurve, stripY } from './light-strip';
import { plantPaths } from './plants';
import { px } from './section-frame';
import type { SectionModel, TierModel } from './section-model';

interface TierPartProps {
  model: TierModel;
  section: SectionModel;
  hatchId: string;
  selected: boolean;
  hours: number;
  band: { low: number; high: number } | null;
  /** The mean as it was before the lamp was taken hold of. */
  before: readonly number[] | null;
}

export function TierPart({ model, section, hatchId, selected, hours, band, before }: TierPartProps) {
  const { shelf, leafY, habit, sitesAcross } = model;
  const plants = plantPaths({ habit, count: sitesAcross, x0: shelf.x0, x1: shelf.x1, shelfY: shelf.y0, leafY });
  return (
    <g aria-hidden="true">
      <StripPart model={model} tentRightPx={section.tent.x1} hours={hours} band={band} before={before} />
      {model.tier.target && (
        <g stroke="var(--moss)" strokeWidth={0.9}>
          <path d={plants.stems} fill="none" strokeWidth={1.4} />
          <path d={plants.back} fill="var(--leaf-back)" />
          <path d={plants.front} fill="var(--leaf)" />
          <path d={plants.veins} fill="none" strokeWidth={0.55} strokeOpacity={0.8} />
        </g>
      )}
      <path d={plants.pots} fill="var(--sheet)" stroke="var(--ink)" strokeWidth={1.1} />
      <rect
        x={px(shelf.x0)}
        y={px(shelf.y0)}
        width={px(shelf.x1 - shelf.x0)}
        height={px(shelf.y1 - shelf.y0)}
        fill="var(--sheet)"
      />
      <rect
        x={px(shelf.x0)}
        y={px(shelf.y0)}
        width={px(shelf.x1 - shelf.x0)}
        height={px(shelf.y1 - shelf.y0)}
        fill={`url(#${hatchId})`}
        stroke={selected ? 'var(--lamp)' : 'var(--ink)'}
        strokeWidth={selected ? 2 : 1.5}
      />
      <path
        d={`M${px(shelf.x0)} ${px(shelf.y0)}v-8M${px(shelf.x1)} ${px(shelf.y0)}v-8`}
        stroke="var(--ink)"
        strokeWidth={1.5}
      />
    </g>
  );
}

interface StripPartProps extends Pick<TierPartProps, 'model' | 'hours' | 'band' | 'before'> {
  tentRightPx: number;
}

function StripPart({ model, tentRightPx, hours, band, before }: StripPartProps) {
  if (!model.strip) return null;
  const { form, curve, cells, profile } = model.strip;
  const width = (cells.x1 - cells.x0) / profile.mean.length;
  const low = band && bandPpfd(band.low, hours);
  const high = band && bandPpfd(band.high, hours);
  const hasBand = low !== null && high !== null && form !== 'bar';
  const yLow = hasBand ? stripY(curve, low) : 0;
  const yHigh = hasBand ? stripY(curve, high) : 0;
  const bracketX = tentRightPx + 9;
  return (
    <g>
      {form !== 'bar' && (
        <rect
          x={px(curve.x0)}
          y={px(curve.top)}
          width={px(curve.x1 - curve.x0)}
          height={curve.height}
          fill="var(--sheet)"
        />
      )}
      {hasBand && yLow - yHigh > 0.5 && (
        <>
          <rect
            x={px(curve.x0)}
            y={px(yHigh)}
            width={px(curve.x1 - curve.x0)}
            height={px(yLow - yHigh)}
            fill="var(--moss)"
            fillOpacity={0.22}
          />
          <path
            d={`M${px(curve.x0)} ${px(yHigh)}H${px(curve.x1)}M${px(curve.x0)} ${px(yLow)}H${px(curve.x1)}`}
            stroke="var(--moss)"
            strokeWidth={0.75}
          />
          {form === 'full' && (
            <>
              <path
                d={`M${px(curve.x1)} ${px(yHigh)}H${px(bracketX)}M${px(curve.x1)} ${px(yLow)}H${px(bracketX)}`}
                stroke="var(--moss)"
                strokeWidth={0.75}
                strokeDasharray="2 2.5"
              />
              <path
                d={`M${px(bracketX)} ${px(yHigh)}h5V${px(yLow)}h-5`}
                fill="none"
                stroke="var(--moss)"
                strokeWidth={1.75}
              />
            </>
          )}
        </>
      )}
      {form !== 'bar' && (
        <>
          <path d={stripBand(profile.low, profile.high, curve)} fill="var(--ink-soft)" fillOpacity={0.3} />
          {before && (
            <path
              d={stripCurve(before, curve)}
              fill="none"
              stroke="var(--ink-soft)"
              strokeWidth={1}
              strokeDasharray="3 3"
            />
          )}
          <path d={stripCurve(profile.mean, curve)} fill="none" stroke="var(--ink)" strokeWidth={1.75} />
        </>
      )}
      {profile.mean.map((value, i) => (
        <rect
          key={i}
          x={px(cells.x0 + i * width)}
          y={px(cells.y0)}
          width={px(width + 0.3)}
          height={px(cells.y1 - cells.y0)}
          fill={rampVar(value)}
        />
      ))}
      <rect
        x={px(cells.x0)}
        y={px(cells.y0)}
        width={px(cells.x1 - cells.x0)}
        height={px(cells.y1 - cells.y0)}
        fill="none"
        stroke="var(--ink)"
        strokeWidth={0.75}
        strokeOpacity={0.5}
      />
    </g>
  );
}
