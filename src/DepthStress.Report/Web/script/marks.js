import { SI, convert } from "./numbers.js";
import { screenOf } from "./layout.js";
import { across } from "./curves.js";

const NEAR = 1.96;

/** What an observation speaks of, with the colour of that curve. */
export const SUBJECTS = { Shmin: "b5472b", SHmax: "d3a012", "pore pressure": "3e95d6", "breakdown pressure": "6b3fa0" };

/** The shape of a mark as points around its place: a disc, or a triangle whose tip points to where the model must lie. */
export function markShape(meaning, size) {
  if (meaning === "upper bound")
    return [
      [0, -size],
      [0, size],
      [-1.6 * size, 0],
    ];
  if (meaning === "lower bound")
    return [
      [0, -size],
      [0, size],
      [1.6 * size, 0],
    ];
  return Array.from({ length: 16 }, (_, k) => [size * Math.cos((Math.PI * k) / 8), size * Math.sin((Math.PI * k) / 8)]);
}

function pressureTrack(layout) {
  return layout.tracks.find((p) => p.track.id === "stress");
}

/** Mean Shmin of each layer, as a bar over the stress track. */
export function paintLayers(g, layout, view, colours) {
  const place = pressureTrack(layout);
  const curve = place?.track.curves.find((c) => c.column === "shmin");
  if (!curve) return;
  const unit = view.store.columns.get("shmin").unit(view.units);
  g.strokeStyle = colours.curve(curve.colour);
  g.lineWidth = 2.5;
  for (const layer of view.store.layers.filter((l) => l.shmin !== undefined)) {
    const x = across(place, curve[view.units], convert(layer.shmin, SI, unit));
    const [a, b] = view.span(layer).map((d) => Math.min(Math.max(screenOf(layout, view, d), layout.top), layout.base));
    if (!(b > a)) continue;
    g.beginPath();
    g.moveTo(x, a);
    g.lineTo(x, b);
    g.stroke();
  }
}

/** Observations with their 95 % error bars on the stress track; returns where each was put. */
export function paintObservations(g, layout, view, colours) {
  const place = pressureTrack(layout);
  const curve = place?.track.curves.find((c) => ["shmin", "sv", "pp"].includes(c.column));
  if (!curve) return [];
  const unit = view.store.columns.get(curve.column).unit(view.units);
  const scale = curve[view.units];
  const put = [];
  for (const o of view.store.observations) {
    const y = screenOf(layout, view, view.fromSi(o[view.kind]));
    if (!(y >= layout.top && y <= layout.base)) continue;
    const at = (si) => Math.min(Math.max(across(place, scale, convert(si, SI, unit)), place.left), place.right);
    const [x, a, b] = [at(o.value), at(o.value - NEAR * o.sigma), at(o.value + NEAR * o.sigma)];
    const pen = colours.curve(SUBJECTS[o.subject] ?? "22313f");
    bar(g, a, b, y, colours.named("paper"), 4);
    bar(g, a, b, y, pen, 1.6);
    shape(g, x, y, markShape(o.meaning, 5.6), colours.named("paper"));
    shape(g, x, y, markShape(o.meaning, 4.4), pen);
    put.push({ kind: o.kind, meaning: o.meaning, x, y, left: a, right: b });
  }
  return put;
}

function bar(g, a, b, y, colour, width) {
  g.strokeStyle = colour;
  g.lineWidth = width;
  g.beginPath();
  g.moveTo(a, y);
  g.lineTo(b, y);
  g.moveTo(a, y - 3);
  g.lineTo(a, y + 3);
  g.moveTo(b, y - 3);
  g.lineTo(b, y + 3);
  g.stroke();
}

function shape(g, x, y, points, colour) {
  g.fillStyle = colour;
  g.beginPath();
  points.forEach(([dx, dy]) => g.lineTo(x + dx, y + dy));
  g.fill();
}

/** The key below the tracks: marks in use, layers, origins in use. */
export function fillLegend(list, store, colours) {
  const item = (text, points, colour, stroke) => {
    const li = document.createElement("li");
    const svg = document.createElementNS("http://www.w3.org/2000/svg", "svg");
    svg.setAttribute("viewBox", "-11 -6 22 12");
    svg.setAttribute("aria-hidden", "true");
    const polygon = document.createElementNS("http://www.w3.org/2000/svg", "polygon");
    polygon.setAttribute("points", points.map((p) => p.join(",")).join(" "));
    polygon.setAttribute("fill", colour);
    if (stroke) polygon.setAttribute("stroke", stroke);
    svg.append(polygon);
    li.append(svg, text);
    list.append(li);
  };
  list.replaceChildren();
  const box = (w, h) => [
    [-w, -h],
    [w, -h],
    [w, h],
    [-w, h],
  ];
  for (const meaning of ["value", "upper bound", "lower bound"].filter((m) => store.observations.some((o) => o.meaning === m)))
    item(
      meaning === "value" ? "observed value, bar 95 %" : `observed ${meaning}, the tip towards the model`,
      markShape(meaning, 4.5),
      colours.named("text"),
    );
  for (const [subject, hex] of Object.entries(SUBJECTS).filter(([s]) => store.observations.some((o) => o.subject === s)))
    item(`of ${subject}`, markShape("value", 4.5), colours.curve(hex));
  if (store.layers.some((l) => l.shmin !== undefined)) item("layer: mean Shmin", box(1.4, 6), colours.curve(SUBJECTS.Shmin));
  item(
    "wedge: beyond the scale",
    [
      [-4, 0],
      [3, -4],
      [3, 4],
    ],
    colours.named("text"),
  );
  const used = new Set(
    store.tracks
      .flatMap((t) => t.curves)
      .filter((c) => c.origin)
      .flatMap((c) => store.words.get(c.origin).runs.map((r) => r.word)),
  );
  for (const [origin, hex] of Object.entries(store.origins).filter(([o]) => used.has(o)))
    item(`origin: ${origin}`, box(8, 5), colours.curve(hex), colours.named("edge"));
}
