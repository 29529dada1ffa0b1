import { SI, convert } from "./numbers.js";

/** What is looked at: depth kind, units, the window of depth, the row under the crosshair, the tracks shown. */
export class View {
  constructor(store) {
    this.store = store;
    this.kind = "md";
    this.units = store.units;
    this.row = -1;
    this.shown = new Set(store.tracks.filter((t) => t.shown).map((t) => t.id));
    this.whole();
  }

  depths() {
    return this.store.columns.get(this.kind).values(this.units);
  }

  depthUnit() {
    return this.store.columns.get("md").unit(this.units);
  }

  tracks() {
    return this.store.tracks.filter((t) => this.shown.has(t.id));
  }

  fromSi(metres) {
    return metres === null ? NaN : convert(metres, SI, this.depthUnit());
  }

  /** A depth of a zone, layer or observation, given in metres for each kind. */
  span(item) {
    return item[this.kind].map((d) => this.fromSi(d));
  }

  limits() {
    const { low, high } = this.depths();
    let [top, base] = [Infinity, -Infinity];
    for (let i = 0; i < low.length; i++) {
      if (low[i] < top) top = low[i];
      if (high[i] > base) base = high[i];
    }
    if (!(base > top)) [top, base] = Number.isFinite(top) ? [top - 1, top + 1] : [0, 1];
    return [top, base];
  }

  whole() {
    [this.top, this.base] = this.limits();
  }

  /** Sets the window, held inside the log and never narrower than a few rows. */
  show(top, base) {
    const [first, last] = this.limits();
    const least = Math.min(last - first, (8 * (last - first)) / Math.max(8, this.store.rows));
    const height = Math.min(Math.max(base - top, least), last - first);
    const middle = (top + base) / 2;
    this.top = Math.min(Math.max(middle - height / 2, first), last - height);
    this.base = this.top + height;
  }

  zoom(factor, around = (this.top + this.base) / 2) {
    this.show(around - (around - this.top) * factor, around + (this.base - around) * factor);
  }

  move(by) {
    this.show(this.top + by, this.base + by);
  }

  isWhole() {
    const [top, base] = this.limits();
    return this.base - this.top >= (base - top) * (1 - 1e-9);
  }

  /** Changes depth kind or units; the window keeps showing the same rows. */
  change(kind, units) {
    const whole = this.isWhole();
    const [a, b] = [this.nearest(this.top), this.nearest(this.base)];
    this.kind = kind;
    this.units = units;
    const { low } = this.depths();
    if (whole || a < 0 || b < 0) this.whole();
    else this.show(Math.min(low[a], low[b]), Math.max(low[a], low[b]));
  }

  /** The row nearest to a depth; -1 when there is none. */
  nearest(depth) {
    const { low, high } = this.depths();
    let [best, row] = [Infinity, -1];
    for (let i = 0; i < low.length; i++) {
      const away = depth < low[i] ? low[i] - depth : depth > high[i] ? depth - high[i] : 0;
      if (away < best) [best, row] = [away, i];
    }
    return row;
  }

  /** Puts the crosshair on a row and keeps it inside the window. */
  point(row) {
    this.row = row < 0 ? -1 : Math.min(row, this.store.rows - 1);
    if (this.row < 0) return;
    const depth = this.depths().low[this.row];
    if (depth < this.top) this.move(depth - this.top);
    if (depth > this.base) this.move(depth - this.base);
  }
}
