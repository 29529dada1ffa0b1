import { convert, digitsText, digitsValue, fixedText } from "./numbers.js";

const MISSING = -2147483648;

function decode(text, wide) {
  const binary = atob(text);
  const bytes = new Uint8Array(binary.length);
  for (let i = 0; i < binary.length; i++) bytes[i] = binary.charCodeAt(i);
  if (wide) return new Float64Array(bytes.buffer);
  const digits = Float64Array.from(new Int32Array(bytes.buffer));
  for (let i = 0; i < digits.length; i++) if (digits[i] === MISSING) digits[i] = NaN;
  return digits;
}

/** The data of the page: columns of printed digits by id, words by id, tracks, zones, layers, observations. */
export function readStore(text) {
  const data = JSON.parse(text);
  const columns = new Map(data.columns.map((c) => [c.id, column(c, data.units)]));
  const words = new Map(data.words.map((w) => [w.id, wordAt(w)]));
  return { ...data, columns, words, frictionAt: (row) => runAt(data.friction, row) };
}

function column(raw, own) {
  const unit = raw[own];
  // Decoded when first asked for: a page opens with some of its tracks.
  let digits = null;
  const ends = () => {
    if (!digits) {
      const low = decode(raw.low, raw.wide);
      digits = { low, high: raw.high ? decode(raw.high, raw.wide) : low };
    }
    return digits;
  };
  const cache = new Map();
  const scaled = (digits, to) => {
    const values = new Float64Array(digits.length);
    for (let i = 0; i < digits.length; i++) values[i] = convert(digitsValue(digits[i], unit.decimals), unit, to);
    return values;
  };
  return {
    id: raw.id,
    title: raw.title,
    symbol: raw.symbol,
    unit: (units) => raw[units],
    /** Values of all rows in a unit system: the least and the greatest of each. */
    values(units) {
      if (!cache.has(units)) {
        const { low, high } = ends();
        const first = scaled(low, raw[units]);
        cache.set(units, { low: first, high: high === low ? first : scaled(high, raw[units]) });
      }
      return cache.get(units);
    },
    /** The text of a row: the printed digits, or converted from them; least and greatest where they differ. */
    text(row, units) {
      const one = (digits) =>
        units === own
          ? digitsText(digits, unit.decimals)
          : fixedText(convert(digitsValue(digits, unit.decimals), unit, raw[units]), raw[units].decimals);
      const { low, high } = ends();
      const [a, b] = [one(low[row]), one(high[row])];
      return a === b ? a : `${a} to ${b}`;
    },
  };
}

/** The value of a row in a list of runs: one past the last row, then the value, over and over. */
function runAt(runs, row) {
  for (let i = 0; i < runs.length; i += 2) if (row < runs[i]) return runs[i + 1];
  return NaN;
}

function wordAt(raw) {
  const ends = raw.runs.filter((_, i) => i % 2 === 0);
  const numbers = raw.runs.filter((_, i) => i % 2 === 1);
  return {
    id: raw.id,
    title: raw.title,
    any: raw.list.some((w) => w !== ""),
    runs: ends.map((end, i) => ({ start: i === 0 ? 0 : ends[i - 1], end, word: raw.list[numbers[i]] })),
    at(row) {
      let [a, b] = [0, ends.length - 1];
      while (a < b) {
        const m = (a + b) >> 1;
        if (ends[m] > row) b = m;
        else a = m + 1;
      }
      return ends.length === 0 ? "" : raw.list[numbers[a]];
    },
  };
}
