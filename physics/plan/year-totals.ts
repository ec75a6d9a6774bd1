import type { TentState } from '../heat/tent-state';
import { tentCost } from '../power/bill';
import { daysInMonth } from '../schedule/local-year';
import type { Device, EnergyByDevice, MonthResult, YearResult } from './evaluation-document';
import { PeakMean } from './peak-mean';
import type { ResolvedScenario } from './resolved-scenario';

export const DEVICES: readonly Device[] = ['light', 'heater', 'exhaust', 'circulation', 'pump'];

interface Stretch {
  /** Before tax, major units a kWh. */
  price: number;
  powerW: Record<Device, number>;
  /** All devices together, the pump at its highest five-minute mean. */
  peakW: number;
  state: TentState;
  unmetK: number;
  overK: number;
  sweats: boolean;
}

interface MonthSums {
  hours: number;
  energyKwh: Record<Device, number>;
  /** Σ price × energy by device. */
  charge: Record<Device, number>;
  temp: { min: number; sum: number; max: number };
  humidity: { min: number; sum: number; max: number };
  vpdSum: number;
  unmetHeatKh: number;
  overheatKh: number;
  condensationH: number;
  waterL: number;
}

const zero = (): Record<Device, number> => ({ light: 0, heater: 0, exhaust: 0, circulation: 0, pump: 0 });
const spread = () => ({ min: Infinity, sum: 0, max: -Infinity });
const emptyMonth = (): MonthSums => ({
  hours: 0,
  energyKwh: zero(),
  charge: zero(),
  temp: spread(),
  humidity: spread(),
  vpdSum: 0,
  unmetHeatKh: 0,
  overheatKh: 0,
  condensationH: 0,
  waterL: 0,
});

const withTotal = (energy: Record<Device, number>): EnergyByDevice => ({
  ...energy,
  total: DEVICES.reduce((sum, device) => sum + energy[device], 0),
});

function widen(into: { min: number; sum: number; max: number }, value: number, hours: number): void {
  into.min = Math.min(into.min, value);
  into.max = Math.max(into.max, value);
  into.sum += value * hours;
}

/** Adds up a year, stretch by stretch. Months are those of the wall clock. */
export class YearTotals {
  private readonly months = Array.from({ length: 12 }, emptyMonth);
  private readonly peak = new PeakMean();

  constructor(
    private readonly year: number,
    private readonly power: ResolvedScenario['power'],
  ) {}

  add(month: number, hours: number, { price, powerW, peakW, state, unmetK, overK, sweats }: Stretch): void {
    const sums = this.months[month - 1]!;
    sums.hours += hours;
    for (const device of DEVICES) {
      const kwh = (powerW[device] * hours) / 1000;
      sums.energyKwh[device] += kwh;
      sums.charge[device] += kwh * price;
    }
    widen(sums.temp, state.tempC, hours);
    widen(sums.humidity, state.relHumidityPct, hours);
    sums.vpdSum += ((state.saturationPa - state.vapourPa) / 1000) * hours;
    sums.unmetHeatKh += unmetK * hours;
    sums.overheatKh += overK * hours;
    sums.condensationH += sweats ? hours : 0;
    sums.waterL += state.evaporationKgH * hours;
    this.peak.add(hours, peakW);
  }

  /**
   * By the clock each device pays for its own hours; on steps, and for a fixed charge, all share by what they draw (in equal
   * parts where nothing draws).
   */
  private monthResult(sums: MonthSums, index: number): MonthResult {
    const energyKwh = withTotal(sums.energyKwh);
    const clockCharge = DEVICES.reduce((sum, device) => sum + sums.charge[device], 0);
    const cost = tentCost({
      tariff: this.power.tariff,
      energyKwh: energyKwh.total,
      clockCharge,
      daysInMonth: daysInMonth(this.year, index + 1),
    });
    const taxed = 1 + (this.power.tariff.taxPct ?? 0) / 100;
    const shared = cost - clockCharge * taxed;
    const costByDevice = zero();
    for (const device of DEVICES)
      costByDevice[device] =
        sums.charge[device] * taxed +
        (energyKwh.total > 0 ? (shared * energyKwh[device]) / energyKwh.total : shared / DEVICES.length);
    const mean = (of: { min: number; sum: number; max: number }) => ({
      min: of.min,
      mean: of.sum / sums.hours,
      max: of.max,
    });
    return {
      month: index + 1,
      energyKwh,
      cost,
      costByDevice,
      airTempC: mean(sums.temp),
      relHumidityPct: mean(sums.humidity),
      vpdKpa: { mean: sums.vpdSum / sums.hours },
      unmetHeatKh: sums.unmetHeatKh,
      overheatKh: sums.overheatKh,
      condensationH: sums.condensationH,
      waterL: sums.waterL,
    };
  }

  result(): YearResult {
    const months = this.months.map((sums, index) => this.monthResult(sums, index));
    const energy = zero();
    const costByDevice = zero();
    for (const month of months) {
      for (const device of DEVICES) {
        energy[device] += month.energyKwh[device];
        costByDevice[device] += month.costByDevice[device];
      }
    }
    const energyKwh = withTotal(energy);
    return {
      months,
      energyKwh,
      cost: months.reduce((sum, month) => sum + month.cost, 0),
      costByDevice,
      co2Kg: (energyKwh.total * this.power.co2GKwh) / 1000,
      peakPowerW: this.peak.result(),
      netLightEnergyKwh: 0,
      heaterCyclesPerH: 0,
    };
  }
}
