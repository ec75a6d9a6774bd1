/** What a tier is called where it has no name of its own. */

interface Named {
  id: string;
  name?: string | undefined;
  topHeightM: number;
}

const ORDINALS = ['Second', 'Third', 'Fourth', 'Fifth', 'Sixth', 'Seventh'];

function placeName(place: number, count: number): string {
  if (count === 1) return 'The tier';
  if (count === 2) return place === 0 ? 'Lower tier' : 'Upper tier';
  if (place === 0) return 'Bottom tier';
  if (place === count - 1) return 'Top tier';
  if (count === 3) return 'Middle tier';
  return `${ORDINALS[place - 1] ?? `${place + 1}th`} tier`;
}

/** Names that only say the place read as one: "Lower" is the lower tier. */
const PLACE_ONLY = /^(lower|middle|upper|top|bottom|second|third|fourth|fifth)$/i;

export function tierName(tiers: readonly Named[], id: string): string {
  const upward = [...tiers].sort((a, b) => a.topHeightM - b.topHeightM);
  const place = upward.findIndex((tier) => tier.id === id);
  if (place < 0) return 'No tier';
  const own = upward[place]!.name?.trim();
  if (own) return PLACE_ONLY.test(own) ? `${own} tier` : own === 'Only' ? 'The tier' : own;
  return placeName(place, tiers.length);
}

/** The name inside a sentence: "over the upper tier", but a name of its own keeps its capital. */
export function tierNameInside(tiers: readonly Named[], id: string): string {
  const own = tiers.find((tier) => tier.id === id)?.name?.trim();
  if (own && own !== 'Only' && !PLACE_ONLY.test(own)) return own;
  const name = tierName(tiers, id);
  return name === 'The tier' ? 'the tier' : `the ${name[0]!.toLowerCase()}${name.slice(1)}`;
}
