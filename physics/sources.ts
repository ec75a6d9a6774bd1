import type { Standing } from './plan/evaluation-document';

export interface Source {
  citation: string;
  /** How its figures came here: read in it, read where it is quoted, or recalled. */
  standing: Standing;
}

/** Each work once. A docstring's `@source [Key]` and the product's pages name works by these keys. */
export const sources = {
  ASHRAE2017: { citation: 'ASHRAE Handbook, Fundamentals (2017), chapter 1: Psychrometrics', standing: 'secondary' },
  IAPWS: { citation: 'IAPWS-IF97, saturation line (region 4)', standing: 'recalled' },
  ISO6946: { citation: 'ISO 6946:2017, surface resistances', standing: 'secondary' },
  ASHRAE140: { citation: 'ANSI/ASHRAE Standard 140, combined interior surface coefficient', standing: 'secondary' },
  FAO56: {
    citation: 'Allen, Pereira, Raes & Smith 1998, Crop evapotranspiration, FAO Irrigation and Drainage Paper 56',
    standing: 'secondary',
  },
  Graamans2017: {
    citation:
      'Graamans, van den Dobbelsteen, Meinen & Stanghellini 2017, Plant factories; crop transpiration and energy balance, Agricultural Systems 153:138–147',
    standing: 'secondary',
  },
  POOL1998: { citation: 'ASHRAE Transactions 104(1), 1998: evaporation from water pools', standing: 'read' },
  SURFACES: {
    citation: 'Fortescue, Swinerd & Stark 2011, Spacecraft Systems Engineering, table 11.3',
    standing: 'read',
  },
  S640: {
    citation: 'ANSI/ASABE S640 (2017), Quantities and Units of Electromagnetic Radiation for Plants',
    standing: 'secondary',
  },
  Lambert1760: { citation: 'Lambert 1760, Photometria: the polygon formula', standing: 'recalled' },
  Howell: {
    citation: 'Howell, A Catalog of Radiation Heat Transfer Configuration Factors, C-13',
    standing: 'secondary',
  },
  CIE15: { citation: 'CIE 15 illuminants and the 1924 V(λ), photons for each lumen', standing: 'computed' },
  Thimijan1983: { citation: 'Thimijan & Heins 1983, HortScience 18:818–822, lux for each µmol', standing: 'secondary' },
  NEC210: {
    citation: 'NFPA 70 (NEC) 210.19, 210.20 and 210.23: continuous load at 80 % of the rating',
    standing: 'secondary',
  },
  NFPA_HEATER: { citation: 'NFPA, Electric Portable Space Heater Safety (2018)', standing: 'read' },
  CPSC_HEATER: { citation: 'US Consumer Product Safety Commission, advice on space heaters', standing: 'secondary' },
  ESFI: { citation: 'Electrical Safety Foundation International, ground-fault protection and cords', standing: 'read' },
  BS7671: { citation: 'BS 7671 411.3.3: 30 mA residual-current devices on sockets', standing: 'secondary' },
  IEC62471: { citation: 'IEC 62471 and IEC 62471-7: photobiological safety of lamps', standing: 'secondary' },
  EGRID2023: { citation: 'US EPA eGRID2023 rev. 2, total output emission rate', standing: 'secondary' },
  EEA: { citation: 'European Environment Agency, greenhouse gas emission intensity of electricity', standing: 'read' },
  JUDGEMENT: { citation: 'Judged from the physics and from practice; no source that says it', standing: 'judgement' },
  RECALLED: { citation: 'Recalled, unconfirmed', standing: 'recalled' },
  NIST_SP811: { citation: 'NIST SP 811, appendix B: conversion factors', standing: 'recalled' },
  SUNCALC: { citation: 'suncalc 2: position of the sun and times of sunrise and sunset', standing: 'computed' },
} as const satisfies Record<string, Source>;

export type SourceKey = keyof typeof sources;
