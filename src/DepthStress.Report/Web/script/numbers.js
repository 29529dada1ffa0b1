/** The unit of SI itself. */
export const SI = { factor: 1, offset: 0 };

/** Text of a whole number of digits with a decimal point before the last ones: 123456 with 4 is "12.3456". */
export function digitsText(digits, decimals) {
  if (!Number.isFinite(digits)) return "";
  const sign = digits < 0 ? "-" : "";
  const text = String(Math.abs(digits)).padStart(decimals + 1, "0");
  return decimals === 0 ? sign + text : `${sign}${text.slice(0, -decimals)}.${text.slice(-decimals)}`;
}

/** The number that digits stand for; the same double that reading the printed text gives. */
export function digitsValue(digits, decimals) {
  return Number.isFinite(digits) ? digits / 10 ** decimals : NaN;
}

/** A value in another unit; both units give SI as value * factor + offset. */
export function convert(value, from, to) {
  return from === to ? value : (value * from.factor + from.offset - to.offset) / to.factor;
}

/** A value with fixed decimals, without a minus sign on zero. */
export function fixedText(value, decimals) {
  if (!Number.isFinite(value)) return "";
  const text = value.toFixed(decimals);
  return Number(text) === 0 ? text.replace("-", "") : text;
}

/** The least of 1, 2 or 5 times a power of ten that cuts a range into at most so many parts. */
export function roundStep(range, parts) {
  const raw = range / Math.max(1, parts);
  if (!(raw > 0)) return 1;
  const power = 10 ** Math.floor(Math.log10(raw));
  return power * ([1, 2, 5].find((f) => f * power >= raw * (1 - 1e-9)) ?? 10);
}

/** A multiple of a step with the decimals that the step needs. */
export function stepText(value, step) {
  return fixedText(value, Math.max(0, Math.ceil(-Math.log10(step) - 1e-9)));
}

/** A scale's end, as short as it can be. */
export function endText(value) {
  return String(Number(value.toPrecision(4)));
}
