interface QuantityProps {
  /** Already rounded to its honest digits; "OL" and other words pass through. */
  readonly value: string | number;
  /** Unit symbol, e.g. "kΩ"; empty for words. */
  readonly unit?: string;
  readonly className?: string;
}

/** A number with its unit in the reading's type; the two never part at a line's end. */
export function Quantity({ value, unit, className = "" }: QuantityProps) {
  const text = typeof value === "number" ? String(value).replace("-", "\u2212") : value;
  return <span className={`font-mono whitespace-nowrap ${className}`}>{unit ? `${text}\u00a0${unit}` : text}</span>;
}
