import type { HeatResult } from './evaluation-document';

export type ColdState = 'coldDark' | 'coldDawn' | 'coldLight';
const COLD_STATES: readonly ColdState[] = ['coldDark', 'coldDawn', 'coldLight'];

/** The cold state that needs most heat: not always the night, since the day is kept warmer. */
export const worstColdState = (heat: HeatResult): ColdState =>
  COLD_STATES.reduce((worst, state) => (heat[state].heaterW > heat[worst].heaterW ? state : worst));

/** What a heater must give in the coldest hours, W. */
export const heaterNeedW = (heat: HeatResult): number => heat[worstColdState(heat)].heaterW;
