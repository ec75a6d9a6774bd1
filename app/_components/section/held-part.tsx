/** While a lamp is held: where it was, a rail with a tick every 4 cm, where its tier has enough, and its height. */
import { LampGhost } from './lamp-part';
import type { LampOutline } from './lamp-outline';
import { px, type SectionFrame } from './section-frame';

interface HeldPartProps {
  frame: SectionFrame;
  ghosts: readonly LampOutline[];
  lead: LampOutline;
  /** Heights of the lamp's face above the floor: ends of the rail, and the stretch in which the tier is inside its band. */
  railM: { lowM: number; highM: number };
  insideM: { fromM: number; toM: number } | null;
  tag: string;
  insideWords: string | null;
}

export function HeldPart({ frame, ghosts, lead, railM, insideM, tag, insideWords }: HeldPartProps) {
  const at = (metres: number) => frame.floorPx - metres * frame.pxPerM;
  const x = lead.facePx[0];
  const y = lead.facePx[1];
  const right = x < frame.leftPx + (frame.acrossM * frame.pxPerM) / 2;
  const ticks: number[] = [];
  for (let m = railM.lowM; m <= railM.highM + 1e-9; m += 0.04) ticks.push(at(m));
  const side = right ? 1 : -1;
  const bracketX = x + side * 27;
  const tagX = right ? x + 22 : x - 22 - 62;
  return (
    <g aria-hidden="true">
      {ghosts.map((ghost, i) => (
        <LampGhost key={i} outline={ghost} tone="was" />
      ))}
      <path d={`M${px(x)} ${px(at(railM.highM))}V${px(at(railM.lowM))}`} stroke="var(--lamp)" strokeWidth={1.5} />
      <path d={ticks.map((tickY) => `M${px(x - 4)} ${px(tickY)}h8`).join('')} stroke="var(--lamp)" strokeWidth={0.9} />
      {insideM && (
        <>
          <path
            d={`M${px(bracketX - side * 5)} ${px(at(insideM.toM))}h${5 * side}V${px(at(insideM.fromM))}h${-5 * side}`}
            fill="none"
            stroke="var(--sheet)"
            strokeWidth={4.5}
          />
          <path
            d={`M${px(bracketX - side * 5)} ${px(at(insideM.toM))}h${5 * side}V${px(at(insideM.fromM))}h${-5 * side}`}
            fill="none"
            stroke="var(--ink)"
            strokeWidth={2}
          />
          {insideWords && <Slip x={bracketX + side * 6} y={at(insideM.fromM) - 26} text={insideWords} side={side} />}
        </>
      )}
      <rect x={px(tagX)} y={px(y - 40)} width={62} height={26} fill="var(--chip)" />
      <path d={`M${px(right ? tagX + 6 : tagX + 56)} ${px(y - 14)}l0 7l${10 * side} -7z`} fill="var(--chip)" />
      <text x={px(tagX + 31)} y={px(y - 22)} textAnchor="middle" fontSize={14} fontWeight={600} fill="var(--on-chip)">
        {tag}
      </text>
    </g>
  );
}

/** Words in the drawing stand on a square slip of paper. */
export function Slip({
  x,
  y,
  text,
  side = 1,
  tone = 'lamp',
}: {
  x: number;
  y: number;
  text: string;
  side?: number;
  tone?: 'lamp' | 'ember' | 'slate';
}) {
  const width = text.length * 6.6 + 16;
  const left = side > 0 ? x : x - width;
  return (
    <g aria-hidden="true">
      <rect
        x={px(left)}
        y={px(y)}
        width={px(width)}
        height={24}
        fill="var(--sheet)"
        stroke={`var(--${tone})`}
        strokeWidth={1}
      />
      <text x={px(left + 8)} y={px(y + 16)} fontSize={12} fill={tone === 'ember' ? 'var(--ember-ink)' : 'var(--ink)'}>
        {text}
      </text>
    </g>
  );
}
