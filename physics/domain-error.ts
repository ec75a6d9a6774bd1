export interface Domain {
  quantity: string;
  value: unknown;
  min: number;
  max: number;
  unit: string;
}

/** Thrown for input that is physically impossible. Nothing is clamped in silence. */
export class DomainError extends Error {
  readonly quantity: string;
  readonly value: unknown;
  readonly min: number;
  readonly max: number;
  readonly unit: string;

  constructor({ quantity, value, min, max, unit }: Domain) {
    super(`${quantity} is ${String(value)}; it must lie between ${min} and ${max} ${unit}`.trimEnd());
    this.name = 'DomainError';
    this.quantity = quantity;
    this.value = value;
    this.min = min;
    this.max = max;
    this.unit = unit;
  }
}

/** Throws unless the value is a number within the domain, its ends included. */
export function requireWithin({ quantity, value, min, max, unit }: Domain & { value: number }): void {
  if (!(value >= min && value <= max)) throw new DomainError({ quantity, value, min, max, unit });
}
