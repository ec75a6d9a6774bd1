/**
 * A thing keeps its hatch in every drawing: lamps plain, heater rising lines, changed air level lines, vapour dots,
 * dear hours falling lines. With the hatch a print in black ink still reads.
 */
export type PatternName = 'heater' | 'air' | 'vapour' | 'dear' | 'short';

export function patternId(prefix: string, name: PatternName): string {
  return `${prefix}-${name}`;
}

export function patternFill(prefix: string, name: PatternName): string {
  return `url(#${patternId(prefix, name)})`;
}

export function Patterns({ prefix }: { prefix: string }) {
  return (
    <defs>
      <pattern
        id={patternId(prefix, 'heater')}
        width="5"
        height="5"
        patternUnits="userSpaceOnUse"
        patternTransform="rotate(45)"
      >
        <rect width="5" height="5" fill="var(--ember)" fillOpacity="0.3" />
        <rect width="2" height="5" fill="var(--ember)" />
      </pattern>
      <pattern id={patternId(prefix, 'air')} width="4" height="4" patternUnits="userSpaceOnUse">
        <rect width="4" height="4" fill="var(--ink-soft)" fillOpacity="0.12" />
        <rect width="4" height="1.25" fill="var(--ink-soft)" />
      </pattern>
      <pattern id={patternId(prefix, 'vapour')} width="5" height="5" patternUnits="userSpaceOnUse">
        <rect width="5" height="5" fill="var(--frost)" fillOpacity="0.22" />
        <circle cx="1.5" cy="1.5" r="1" fill="var(--frost)" />
        <circle cx="4" cy="4" r="1" fill="var(--frost)" />
      </pattern>
      <pattern
        id={patternId(prefix, 'dear')}
        width="6"
        height="6"
        patternUnits="userSpaceOnUse"
        patternTransform="rotate(-45)"
      >
        <rect width="6" height="6" fill="var(--slate)" fillOpacity="0.16" />
        <rect width="1.5" height="6" fill="var(--slate)" />
      </pattern>
      <pattern
        id={patternId(prefix, 'short')}
        width="7"
        height="7"
        patternUnits="userSpaceOnUse"
        patternTransform="rotate(45)"
      >
        <rect width="0.75" height="7" fill="var(--hatch)" />
      </pattern>
    </defs>
  );
}
