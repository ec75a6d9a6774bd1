declare module 'psychrolib' {
  type Formula = (...args: number[]) => number;
  const psychrolib: { SI: number; SetUnitSystem(system: number): void } & Record<
    | 'GetStandardAtmPressure'
    | 'GetSatVapPres'
    | 'GetHumRatioFromRelHum'
    | 'GetMoistAirDensity'
    | 'GetMoistAirEnthalpy'
    | 'GetTDewPointFromRelHum'
    | 'GetTWetBulbFromRelHum',
    Formula
  >;
  export default psychrolib;
}
