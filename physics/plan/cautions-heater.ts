import type { Caution } from './evaluation-document';
import { rounded, type CautionFacts } from './cautions';
import { sources } from '../sources';
import { heaterNeedW } from './worst-cold-state';

/** Asked for where the maker's label is not known, m. @source NFPA, 3 ft on every side */
export const USUAL_CLEARANCE_M = 1;

const cm = (metres: number) => `${rounded(metres * 100)} cm`;

function clearance({ scenario }: CautionFacts): Caution[] {
  const heater = scenario.climate.heater!;
  const asked = heater.clearanceM ?? USUAL_CLEARANCE_M;
  const label =
    heater.clearanceM === undefined || heater.clearanceM === null
      ? 'its label is not known, so the usual 1 m (3 ft) is asked for'
      : `its maker's label asks for ${cm(heater.clearanceM)}; without a label 1 m (3 ft) is asked for`;
  const { widthM, depthM } = scenario.tent;
  const place = heater.placeM;
  // In the tent, the nearest wall; beside it, the way to the fabric.
  const within = place !== undefined && place[0] >= 0 && place[0] <= widthM && place[1] >= 0 && place[1] <= depthM;
  const outside = (value: number, most: number) => Math.max(0, -value, value - most);
  const nearest = !place
    ? null
    : within
      ? Math.min(place[0], widthM - place[0], place[1], depthM - place[1])
      : Math.hypot(outside(place[0], widthM), outside(place[1], depthM));
  if (nearest !== null && nearest < asked) {
    const tooNarrow = within && Math.min(widthM, depthM) < 2 * asked;
    return [
      {
        code: 'heater.clearance',
        severity: 'danger',
        where: 'climate.heater',
        text: `The heater stands ${cm(nearest)} from the fabric; ${label}. ${tooNarrow ? 'This tent is too narrow for that anywhere: warm the room, or the air that is drawn in, before you heat inside.' : 'Move it, or warm the room or the air that is drawn in.'} The maker's instructions decide.`,
        source: sources.NFPA_HEATER.citation,
      },
    ];
  }
  return [
    {
      code: 'heater.clearance',
      severity: 'warning',
      where: 'climate.heater',
      text: `Keep ${cm(asked)} free on every side of the heater, tent and plants included; ${label}. ${Math.min(widthM, depthM) < 2 * asked ? 'Inside this tent there is no such place: stand it outside and warm the room or the air that is drawn in.' : ''} The maker's instructions decide.`.replace(
        '  ',
        ' ',
      ),
      source: sources.NFPA_HEATER.citation,
    },
  ];
}

function sizing({ scenario, heat, slipTempC }: CautionFacts): Caution[] {
  const ratedW = scenario.climate.heater?.ratedPowerW ?? 0;
  const needW = heaterNeedW(heat);
  if (needW > ratedW + 0.5) {
    return [
      {
        code: 'heater.short',
        severity: 'warning',
        where: 'climate.heater',
        text: `In the coldest hours ${rounded(needW - ratedW)} W are missing: ${ratedW > 0 ? `the heater gives ${rounded(ratedW)} of ${rounded(needW)} W` : `no heater is planned and ${rounded(needW)} W are needed`}${slipTempC === null ? '' : `, so the tent slips to ${rounded(slipTempC, 1)} °C`}. Insulating the tent or warming the room may be safer than a bigger heater.`,
        source: 'Computed from the coldest room temperature',
      },
    ];
  }
  if (needW > 0 && ratedW > 2 * needW) {
    return [
      {
        code: 'heater.oversize',
        severity: 'note',
        where: 'climate.heater',
        text: `The heater is ${rounded(ratedW / needW, 1)} times what the coldest night needs. It will switch often; a smaller one holds steadier and loads the circuit less.`,
        source: 'Judged',
      },
    ];
  }
  return [];
}

/** Water about a heater: trays that flood, a reservoir, leaves that drip. */
function damp({ scenario }: CautionFacts): Caution[] {
  if (scenario.water.pumpW === 0 && scenario.water.reservoirL === 0) return [];
  return [
    {
      code: 'heater.damp',
      severity: 'warning',
      where: 'climate.heater',
      text: 'Trays, hoses and a reservoir share this tent. A heater belongs in damp or splashing air only if its maker allows that; else stand it where no water can reach it.',
      source: `${sources.CPSC_HEATER.citation}; the maker’s instructions decide`,
    },
  ];
}

/** A portable heater in or beside a fabric tent: what fire services and makers ask. */
export function heaterCautions(facts: CautionFacts): Caution[] {
  const { scenario, heat } = facts;
  const heater = scenario.climate.heater;
  if (!heater || heater.ratedPowerW === 0) return sizing(facts);
  const nights = heat.coldDark.heaterW > 0;
  return [
    ...clearance(facts),
    ...sizing(facts),
    ...damp(facts),
    ...(nights
      ? [
          {
            code: 'heater.unattended',
            severity: 'warning',
            where: 'climate.heater',
            text: 'This plan heats through the night. A portable heater is meant to be watched and to be off while you sleep or are out; for heat round the clock take equipment that is listed and installed for it, with over-heat and tip-over cut-out and a thermostat.',
            source: `${sources.NFPA_HEATER.citation}; ${sources.CPSC_HEATER.citation}`,
          } satisfies Caution,
        ]
      : []),
    {
      code: 'heater.socket',
      severity: 'warning',
      where: 'climate.heater',
      text: 'Plug the heater straight into a wall socket that nothing else uses: no extension lead, no power strip, no timer or smart plug that is not rated for it. A warm plug means stop.',
      source: `${sources.NFPA_HEATER.citation}; ${sources.CPSC_HEATER.citation}`,
    },
    {
      code: 'heater.alarm',
      severity: 'note',
      where: 'room',
      text: 'A smoke alarm in the room and a clear way out. Nothing that burns fuel ever goes into a tent.',
      source: sources.CPSC_HEATER.citation,
    },
  ];
}
