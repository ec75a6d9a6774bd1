import 'server-only';

import type { Tariff } from '../evaluation/evaluate-scenario';
import { referenceData } from '../reference-data/reference-data';
import { defaultTariff } from './default-tariff';

/** The price in the drawing that a stranger meets first, before anybody typed one. */
export const landingTariff = (): Tariff => defaultTariff('EUR', referenceData().prices).tariff;
