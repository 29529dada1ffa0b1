import { screenOf } from "./layout.js";

/** Where a value lies between a track's edges; it may lie outside. */
export function across(place, scale, value) {
  return place.left + ((value - scale.left) / (scale.right - scale.left)) * (place.right - place.left);
}

/**
 * Paints a curve and returns the extremes it drew inside the window, and how many rows lay off the scale.
 * Rows that share a pixel line are joined into one stroke from their least to their greatest value, so no extreme is lost.
 */
export function paintCurve(g, layout, view, place, curve, colours) {
  const scale = curve[view.units];
  const { low, high } = view.store.columns.get(curve.column).values(view.units);
  const depths = view.depths();
  const drawn = { column: curve.column, least: NaN, greatest: NaN, off: 0 };
  const pen = colours.curve(curve.colour);
  const [first, last] = [Math.min(scale.left, scale.right), Math.max(scale.left, scale.right)];
  const wedges = new Set();
  const margin = (view.base - view.top) * 0.02;
  g.save();
  g.beginPath();
  g.rect(place.left, layout.top, place.right - place.left, layout.base - layout.top);
  g.clip();
  g.beginPath();
  let [pixel, a, b, end, open] = [NaN, 0, 0, 0, false];
  const flush = () => {
    if (Number.isNaN(pixel)) return;
    g.lineTo(a, pixel);
    g.lineTo(b, pixel);
    g.lineTo(end, pixel);
  };
  for (let i = 0; i < low.length; i++) {
    const depth = (depths.low[i] + depths.high[i]) / 2;
    if (!(depth >= view.top - margin && depth <= view.base + margin) || Number.isNaN(low[i])) {
      flush();
      [pixel, open] = [NaN, false];
      continue;
    }
    const y = Math.round(screenOf(layout, view, depth) * 2) / 2;
    const [x1, x2] = [across(place, scale, low[i]), across(place, scale, high[i])];
    if (depth >= view.top && depth <= view.base) {
      if (!(low[i] >= drawn.least)) drawn.least = low[i];
      if (!(high[i] <= drawn.greatest)) drawn.greatest = high[i];
      if (low[i] < first || high[i] > last) drawn.off++;
      if (low[i] < first) wedges.add(`${across(place, scale, first)} ${Math.round(y / 3) * 3}`);
      if (high[i] > last) wedges.add(`${across(place, scale, last)} ${Math.round(y / 3) * 3}`);
    }
    if (y !== pixel) {
      flush();
      if (!open) g.moveTo(x1, y);
      [pixel, a, b, open] = [y, Math.min(x1, x2), Math.max(x1, x2), true];
    } else {
      [a, b] = [Math.min(a, x1, x2), Math.max(b, x1, x2)];
    }
    end = x2;
  }
  flush();
  g.strokeStyle = pen;
  g.lineWidth = curve.width + 0.3;
  g.lineJoin = "bevel";
  g.lineCap = "round";
  g.setLineDash(curve.dash.map((d) => d * 1.3));
  g.stroke();
  g.setLineDash([]);
  g.fillStyle = pen;
  for (const wedge of wedges) {
    const [x, y] = wedge.split(" ").map(Number);
    const inwards = x <= (place.left + place.right) / 2 ? 5 : -5;
    g.beginPath();
    g.moveTo(x, y);
    g.lineTo(x + inwards, y - 3);
    g.lineTo(x + inwards, y + 3);
    g.fill();
  }
  g.restore();
  return drawn;
}

/** Paints the origins of a curve's samples; where several share a pixel line, the weakest. */
export function paintRibbon(g, layout, view, ribbon, colours) {
  const words = view.store.words.get(ribbon.curve.origin);
  const order = Object.keys(view.store.origins);
  const { low, high } = view.depths();
  const runs = words.runs.filter((r) => r.word !== "").sort((p, q) => order.indexOf(p.word) - order.indexOf(q.word));
  for (const run of runs) {
    const next = Math.min(run.end, low.length - 1);
    const span = [screenOf(layout, view, low[run.start]), screenOf(layout, view, run.end < low.length ? low[next] : high[next])];
    const [a, b] = span.sort((p, q) => p - q).map((y) => Math.min(Math.max(y, layout.top), layout.base));
    if (!(b > a)) continue;
    g.fillStyle = colours.curve(view.store.origins[run.word]);
    g.fillRect(ribbon.left, a, ribbon.width, Math.max(1, b - a));
  }
  g.strokeStyle = colours.named("edge");
  g.lineWidth = 0.6;
  g.strokeRect(ribbon.left, layout.top, ribbon.width, layout.base - layout.top);
  g.save();
  g.translate(ribbon.left + ribbon.width / 2, layout.top - 3);
  g.rotate(-Math.PI / 2);
  g.font = "9px sans-serif";
  g.textAlign = "left";
  g.textBaseline = "middle";
  g.fillStyle = colours.named("faint");
  g.fillText("origin", 0, 0);
  g.restore();
}
