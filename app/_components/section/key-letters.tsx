/** On a phone each thing has a letter in the margin, tied to it by a level line, and the same letter before its row. */
import { isSelected } from './plan-edit';
import type { SectionContext } from './section-context';
import { px } from './section-frame';

export interface KeyLetter {
  id: string;
  letter: string;
  side: 'left' | 'right';
  /** Where the letter stands and where its line ends. */
  y: number;
  toPx: readonly [number, number];
  selected: boolean;
}

const APART_PX = 28;

export function keyLetters({ model, selection, doc }: SectionContext): KeyLetter[] {
  type Want = Omit<KeyLetter, 'letter' | 'y'>;
  const wants: Want[] = [
    ...model.groups.flatMap((group): Want[] => {
      const first = model.lamps.find((lamp) => lamp.group === group);
      if (!first) return [];
      const selected = group.lamps.some((lamp) => isSelected(selection, 'lamp', lamp.id));
      return [
        { id: `lamp-${group.id}`, side: 'left', toPx: [first.outline.leftPx + 2, first.outline.holdPx[1]], selected },
      ];
    }),
    ...model.tiers.map((tier): Want => ({
      id: `tier-${tier.tier.id}`,
      side: 'right',
      toPx: [tier.shelf.x1 - 4, (tier.leafY + tier.shelf.y0) / 2],
      selected: isSelected(selection, 'tier', tier.tier.id),
    })),
  ];
  if (model.reservoir)
    wants.push({
      id: 'water',
      side: 'right',
      toPx: [model.reservoir.box.x1 - 6, model.reservoir.waterY + 10],
      selected: isSelected(selection, 'water'),
    });
  if (doc.climate.heater && model.heater && !model.heater.inside)
    wants.push({
      id: 'heater',
      side: 'left',
      toPx: [(model.heater.box.x0 + model.heater.box.x1) / 2, model.heater.box.y0],
      selected: isSelected(selection, 'heater'),
    });
  if (model.fan && model.frame.view === 'front')
    wants.push({
      id: 'fan',
      side: 'right',
      toPx: [model.fan.x, model.fan.y + model.fan.r],
      selected: isSelected(selection, 'fan'),
    });
  const ordered = wants.sort((a, b) => a.toPx[1] - b.toPx[1]);
  const last = { left: -Infinity, right: -Infinity };
  return ordered.map((want, i) => {
    const off = want.id === 'fan' ? 30 : want.id === 'heater' ? -24 : 0;
    const y = Math.max(want.toPx[1] + off, last[want.side] + APART_PX);
    last[want.side] = y;
    return { ...want, letter: String.fromCharCode(97 + i), y };
  });
}

export function KeyLetters({ letters, paperPx }: { letters: readonly KeyLetter[]; paperPx: number }) {
  return (
    <g aria-hidden="true" className="pointer-events-none">
      {letters.map(({ id, letter, side, y, toPx, selected }) => {
        const x = side === 'left' ? 20 : paperPx - 20;
        const stroke = selected ? 'var(--lamp)' : 'var(--ink-soft)';
        return (
          <g key={id}>
            <path d={`M${px(x)} ${px(y)}L${px(toPx[0])} ${px(toPx[1])}`} stroke={stroke} strokeWidth={0.75} />
            <circle cx={px(toPx[0])} cy={px(toPx[1])} r={2} fill={selected ? 'var(--lamp)' : 'var(--ink)'} />
            <circle
              cx={px(x)}
              cy={px(y)}
              r={11}
              fill={selected ? 'var(--chip)' : 'var(--paper)'}
              stroke={selected ? 'var(--chip)' : 'var(--ink)'}
              strokeWidth={1.1}
            />
            <text
              x={px(x)}
              y={px(y + 4)}
              textAnchor="middle"
              fontSize={12}
              fontWeight={600}
              fill={selected ? 'var(--on-chip)' : 'var(--ink)'}
            >
              {letter}
            </text>
          </g>
        );
      })}
    </g>
  );
}
