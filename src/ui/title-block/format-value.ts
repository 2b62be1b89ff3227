/** A quantity's value in small type: four significant digits at most, no trailing zeros. */

export function formatValue(value: number): string {
  if (value === 0) return '0';
  const magnitude = Math.abs(value);
  const text = magnitude >= 1e-3 && magnitude < 1e6 ? String(Number(value.toPrecision(4))) : shortExponential(value);
  return text.replaceAll('-', '−');
}

function shortExponential(value: number): string {
  const [mantissa, exponent] = value.toExponential(3).split('e');
  return `${Number(mantissa)}e${Number(exponent)}`;
}
