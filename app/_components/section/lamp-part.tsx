/** A lamp at its true place and tilt, with the wires or the clamp that hold it. */
import { clampAt, hangingWires, type LampOutline } from './lamp-outline';
import { points, px } from './section-frame';
import type { LampModel, SectionModel } from './section-model';

interface LampPartProps {
  model: LampModel;
  uprights: SectionModel['uprights'];
  selected: boolean;
}

export function LampPart({ model, uprights, selected }: LampPartProps) {
  const { lamp, outline, hangerPx, group } = model;
  const lit = (lamp.dimFrac ?? 1) > 0 && group.hours > 0;
  const point = group.fixture.shape === 'point';
  return (
    <g aria-hidden="true">
      {lamp.mount === 'clamped' && uprights ? (
        <Clamp outline={outline} uprights={uprights} />
      ) : (
        hangingWires(outline, hangerPx).map(([x, from, to]) => (
          <path key={x} d={`M${px(x)} ${px(from)}V${px(to)}`} stroke="var(--ink)" strokeWidth={0.9} />
        ))
      )}
      <LampBodyPart outline={outline} point={point} selected={selected} lit={lit} />
    </g>
  );
}

function LampBodyPart({
  outline,
  point,
  selected,
  lit,
}: {
  outline: LampOutline;
  point: boolean;
  selected: boolean;
  lit: boolean;
}) {
  const body = selected ? 'var(--lamp-fill)' : 'var(--sheet)';
  const edge = selected ? 'var(--lamp)' : 'var(--ink)';
  if (point) {
    const r = Math.max(5, (outline.rightPx - outline.leftPx) / 2);
    return (
      <circle
        cx={px(outline.facePx[0])}
        cy={px(outline.facePx[1])}
        r={px(r)}
        fill={body}
        stroke={edge}
        strokeWidth={1.3}
      />
    );
  }
  return (
    <>
      <polygon points={points(outline.housing)} fill={body} stroke={edge} strokeWidth={selected ? 1.6 : 1.3} />
      <polygon
        points={points(outline.face)}
        fill={lit ? 'var(--ramp-22)' : 'var(--sheet)'}
        stroke={lit ? 'var(--ramp-22)' : edge}
        strokeWidth={3}
        strokeLinejoin="round"
      />
      <polygon points={points(outline.face)} fill="none" stroke={edge} strokeWidth={0.7} />
    </>
  );
}

function Clamp({ outline, uprights }: { outline: LampOutline; uprights: NonNullable<SectionModel['uprights']> }) {
  const { leftPx, rightPx, widthPx } = uprights;
  const clamp = clampAt(outline, [leftPx - widthPx / 2, rightPx + widthPx / 2]);
  const half = Math.max(4, widthPx * 0.75);
  return (
    <>
      <path
        d={`M${px(clamp.uprightPx)} ${px(clamp.y)}L${px(clamp.armTo[0])} ${px(clamp.armTo[1])}`}
        stroke="var(--ink)"
        strokeWidth={2}
      />
      <rect
        x={px(clamp.uprightPx - half)}
        y={px(clamp.y - half)}
        width={px(half * 2)}
        height={px(half * 2)}
        fill="var(--sheet)"
        stroke="var(--ink)"
        strokeWidth={1.1}
      />
    </>
  );
}

/** The lamp where it was, or where it would be: outline only. */
export function LampGhost({ outline, tone }: { outline: LampOutline; tone: 'was' | 'impossible' | 'theirs' }) {
  const stroke = { was: 'var(--ink)', impossible: 'var(--ember)', theirs: 'var(--slate)' }[tone];
  return (
    <polygon
      aria-hidden="true"
      points={points(outline.housing)}
      fill={tone === 'was' ? 'none' : 'var(--sheet)'}
      stroke={stroke}
      strokeWidth={tone === 'was' ? 1 : 1.6}
      strokeDasharray={tone === 'impossible' ? undefined : '3 2.5'}
    />
  );
}
