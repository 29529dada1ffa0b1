import { fixedText, roundStep, stepText } from "./numbers.js";

const NS = "http://www.w3.org/2000/svg";
const BOX = { left: 52, top: 8, right: 292, base: 248 };

/** What friction on faults allows at one depth: `Shmin >= Pp + (Sv - Pp)/q`, `SHmax <= Pp + q (min(Shmin, Sv) - Pp)`, `q = (sqrt(mu^2 + 1) + mu)^2`. */
export function limitsOf(sv, pp, friction) {
  if (!(sv > pp && friction > 0)) return null;
  const q = (Math.sqrt(friction * friction + 1) + friction) ** 2;
  const highestAt = (shmin) => pp + q * (Math.min(shmin, sv) - pp);
  const [lowest, highest] = [pp + (sv - pp) / q, highestAt(sv)];
  const corners = [
    [lowest, lowest],
    [lowest, sv],
    [sv, highest],
    [highest, highest],
  ];
  return { friction, lowest, highest, highestAt, corners };
}

/** The stresses at the crosshair in the units shown, with the polygon they stand in; a bin has the middle of its range. */
export function stateAt(view) {
  if (view.row < 0) return null;
  const { store, row, units } = view;
  const value = (id) => {
    const values = store.columns.get(id)?.values(units);
    return values ? (values.low[row] + values.high[row]) / 2 : NaN;
  };
  const [sv, pp, shmin, shmax] = ["sv", "pp", "shmin", "shmax"].map(value);
  const pressure = ["sv", "pp", "shmin"].map((id) => store.columns.get(id)).find((c) => c);
  return { sv, pp, shmin, shmax, unit: pressure?.unit(units), limits: limitsOf(sv, pp, store.frictionAt(row)) };
}

function verdict({ shmin, shmax, limits }) {
  if (Number.isNaN(shmin)) return "No horizontal stress here.";
  if (shmin < limits.lowest) return "Shmin is below what friction allows.";
  if (Number.isNaN(shmax)) return "Shmin is within what friction allows; SHmax is not known, the dashed line is its range.";
  return shmax <= limits.highestAt(shmin) ? "Within what friction allows." : "SHmax is above what friction allows.";
}

/** The polygon in words: its limits, and where the model stands. */
export function wordsOf(state) {
  if (!state) return "";
  if (!state.limits) return "No polygon: it needs a vertical stress above the pore pressure, and friction.";
  const show = (stress) => `${fixedText(stress, state.unit.decimals > 2 ? 2 : 0)} ${state.unit.unit}`;
  const { friction, lowest, highest, highestAt } = state.limits;
  const here = state.shmin >= lowest ? `; at this Shmin SHmax to ${show(highestAt(state.shmin))}` : "";
  return `Friction ${fixedText(friction, 2)}: Shmin from ${show(lowest)}, SHmax to ${show(highest)}${here}. ${verdict(state)}`;
}

function scaleOf(state) {
  const known = [state.pp, state.limits.highest, state.shmin, state.shmax].filter(Number.isFinite);
  const [low, high] = [Math.max(0, Math.min(...known)), Math.max(...known)];
  const step = roundStep((high - low) * 1.08, 5);
  return { step, low: Math.floor((low - 0.02 * (high - low)) / step) * step, high: Math.ceil((high + 0.02 * (high - low)) / step) * step };
}

function draw(svg, tag, attributes, text) {
  const element = document.createElementNS(NS, tag);
  for (const [name, value] of Object.entries(attributes)) element.setAttribute(name, value);
  if (text !== undefined) element.textContent = text;
  svg.append(element);
}

/** Draws the polygon of a state into an SVG element and says it in words; returns where the model's mark was put. */
export function fillPolygon(svg, words, state) {
  svg.replaceChildren();
  words.textContent = state ? wordsOf(state) : "Put the crosshair on a depth to see its stress polygon.";
  if (!state?.limits) return null;
  const scale = scaleOf(state);
  const share = (v) => (v - scale.low) / (scale.high - scale.low);
  const x = (v) => BOX.left + share(v) * (BOX.right - BOX.left);
  const y = (v) => BOX.base - share(v) * (BOX.base - BOX.top);
  const points = (corners) => corners.map(([a, b]) => `${x(a).toFixed(1)},${y(b).toFixed(1)}`).join(" ");
  for (let v = scale.low; v <= scale.high + scale.step * 1e-6; v += scale.step) {
    draw(svg, "line", { class: "grid", x1: x(v), x2: x(v), y1: BOX.top, y2: BOX.base });
    draw(svg, "line", { class: "grid", x1: BOX.left, x2: BOX.right, y1: y(v), y2: y(v) });
    draw(svg, "text", { x: x(v), y: BOX.base + 14, "text-anchor": "middle" }, stepText(v, scale.step));
    draw(svg, "text", { x: BOX.left - 5, y: y(v) + 4, "text-anchor": "end" }, stepText(v, scale.step));
  }
  const [middle, unit] = [(BOX.left + BOX.right) / 2, state.unit.unit];
  draw(svg, "text", { class: "axis", x: middle, y: BOX.base + 30, "text-anchor": "middle" }, `Shmin, ${unit}`);
  draw(svg, "text", { class: "axis", transform: `translate(10 ${(BOX.top + BOX.base) / 2}) rotate(-90)`, "text-anchor": "middle" }, `SHmax, ${unit}`);
  const { corners, lowest, highest, highestAt } = state.limits;
  draw(svg, "polygon", { class: "allowed", points: points(corners) });
  const { sv, pp, shmin, shmax } = state;
  draw(svg, "polyline", {
    class: "sector",
    points: points([
      [lowest, sv],
      [sv, sv],
      [sv, highest],
    ]),
  });
  // Names stand along the edge they belong to, outside, where no stress can be.
  const sector = ([from, to], text, side) => {
    const [x1, y1, x2, y2] = [x(from[0]), y(from[1]), x(to[0]), y(to[1])];
    const turn = (Math.atan2(y2 - y1, x2 - x1) * 180) / Math.PI;
    const place = `translate(${((x1 + x2) / 2).toFixed(1)} ${((y1 + y2) / 2).toFixed(1)}) rotate(${turn.toFixed(1)})`;
    draw(svg, "text", { class: "sector-name", transform: place, dy: side, "text-anchor": "middle" }, text);
  };
  const equal = (v) => [v, v];
  sector([equal(lowest), equal(sv)], "normal", 13);
  sector([equal(sv), equal(highest)], "reverse", 13);
  sector([corners[1], corners[2]], "strike-slip", -5);
  draw(svg, "rect", { class: "sv", x: x(sv) - 3, y: y(sv) - 3, width: 6, height: 6 });
  draw(svg, "polygon", { class: "pp", points: `${x(pp) - 4},${y(pp) + 3} ${x(pp) + 4},${y(pp) + 3} ${x(pp)},${y(pp) - 4}` });
  if (Number.isNaN(shmin)) return null;
  if (Number.isNaN(shmax)) {
    if (shmin >= lowest) draw(svg, "line", { class: "range", x1: x(shmin), x2: x(shmin), y1: y(shmin), y2: y(highestAt(shmin)) });
    return null;
  }
  const mark = [x(shmin), y(shmax)];
  draw(svg, "polygon", {
    class: "model",
    points: `${mark[0] - 6},${mark[1]} ${mark[0]},${mark[1] - 6} ${mark[0] + 6},${mark[1]} ${mark[0]},${mark[1] + 6}`,
  });
  return { x: mark[0], y: mark[1], left: x(lowest), top: y(highest), right: x(highest), base: y(lowest) };
}
