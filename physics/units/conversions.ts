/**
 * Exact conversions between the units of the trade and SI.
 *
 * value_SI = value × factor (+ offset). The foot, the pound, the US gallon and the international BTU are exact by
 * definition, so every factor here is exact but for the floating-point rounding of its product.
 *
 * @source [NIST-SP811] Appendix B: international foot 0.3048 m, US gallon 3.785411784 L, pound 0.45359237 kg, BTU(IT) 1055.05585262 J
 * @accuracy 1 part in 10¹⁵
 */
export const METRE_PER_FOOT = 0.3048;
export const METRE_PER_INCH = 0.0254;
export const SQUARE_METRE_PER_SQUARE_FOOT = 0.09290304;
export const LITRE_PER_US_GALLON = 3.785411784;
export const LITRE_PER_US_QUART = 0.946352946;
export const KILOGRAM_PER_POUND = 0.45359237;
export const JOULE_PER_BTU = 1055.05585262;
/** 1 cfm = 0.3048³ m³/min. */
export const CUBIC_METRE_PER_HOUR_PER_CFM = 0.3048 ** 3 * 60;
export const WATT_PER_BTU_PER_HOUR = JOULE_PER_BTU / 3600;
/** 1 BTU/(h·ft²·°F) in W/(m²·K). */
export const U_VALUE_PER_BTU_H_FT2_F = (JOULE_PER_BTU / 3600 / SQUARE_METRE_PER_SQUARE_FOOT) * 1.8;
export const KELVIN_PER_FAHRENHEIT_DEGREE = 5 / 9;
export const LUX_PER_FOOT_CANDLE = 1 / SQUARE_METRE_PER_SQUARE_FOOT;
/** Conventional inch of water at 4 °C. */
export const PASCAL_PER_INCH_OF_WATER = 249.08891;
export const JOULE_PER_KWH = 3.6e6;

export const celsiusFromFahrenheit = (tempF: number): number => (tempF - 32) / 1.8;
export const fahrenheitFromCelsius = (tempC: number): number => tempC * 1.8 + 32;
export const ZERO_CELSIUS_K = 273.15;
