import { readStore } from "./store.js";
import { View } from "./view.js";
import { layOut, screenOf } from "./layout.js";
import { ink, line, paintFrame, paintHead } from "./paint.js";
import { paintCurve, paintRibbon } from "./curves.js";
import { fillLegend, paintLayers, paintObservations } from "./marks.js";
import { fillReading, readingAt } from "./reading.js";
import { fillPolygon, stateAt } from "./polygon.js";
import { goTo, listen } from "./input.js";
import { csvOf, enliven, showUnits } from "./tables.js";

const element = (id) => document.getElementById(id);
const store = readStore(element("data").textContent);
const view = new View(store);
const [stage, canvas] = [element("stage"), element("tracks")];
const g = canvas.getContext("2d");
const beside = matchMedia("(min-width: 1700px)"); // the reading then stands beside the tracks
let [layout, drawn, marks, polygon, waiting, selection] = [null, [], [], null, false, null];

function paint() {
  waiting = false;
  const [width, height] = [stage.clientWidth, Math.max(420, Math.min(window.innerHeight - (beside.matches ? 190 : 380), 1400))];
  g.font = "11px sans-serif";
  layout = layOut(view, width, height, (text) => g.measureText(text).width * 1.1);
  const dense = window.devicePixelRatio || 1;
  if (canvas.width !== Math.round(layout.width * dense) || canvas.height !== Math.round(height * dense)) {
    [canvas.width, canvas.height] = [Math.round(layout.width * dense), Math.round(height * dense)];
    [canvas.style.width, canvas.style.height] = [`${layout.width}px`, `${height}px`];
  }
  const colours = ink();
  g.setTransform(dense, 0, 0, dense, 0, 0);
  g.fillStyle = colours.named("paper");
  g.fillRect(0, 0, layout.width, height);
  paintFrame(g, layout, view, colours);
  for (const place of layout.tracks) paintHead(g, layout, view, place, colours);
  paintLayers(g, layout, view, colours);
  drawn = layout.tracks.flatMap((place) =>
    place.track.curves.map((c) => ({ track: place.track.id, ...paintCurve(g, layout, view, place, c, colours) })),
  );
  for (const ribbon of layout.tracks.flatMap((p) => p.ribbons)) paintRibbon(g, layout, view, ribbon, colours);
  marks = paintObservations(g, layout, view, colours);
  const right = layout.tracks.length ? layout.tracks.at(-1).right : layout.width;
  if (selection) {
    const [a, b] = selection.map((d) => screenOf(layout, view, d)).sort((p, q) => p - q);
    g.globalAlpha = 0.2;
    g.fillStyle = colours.named("link");
    g.fillRect(0, a, right, b - a);
    g.globalAlpha = 1;
  }
  const y = view.row < 0 ? NaN : screenOf(layout, view, view.depths().low[view.row]);
  if (y >= layout.top && y <= layout.base) {
    // Not through the names of zones and layers.
    line(g, layout.depth[0], y, layout.depth[1], y, colours.named("mark"), 1);
    line(g, layout.layers[1], y, right, y, colours.named("mark"), 1);
  }
  fillReading(element("values"), readingAt(view));
  polygon = fillPolygon(element("polygon"), element("polygon-words"), stateAt(view));
}

function changed(chosen = null) {
  selection = chosen;
  if (waiting) return;
  waiting = true;
  requestAnimationFrame(paint);
}

function speak(text) {
  const depth = store.columns.get("md");
  const window = `Window ${view.top.toFixed(1)} to ${view.base.toFixed(1)} ${view.depthUnit().unit}`;
  element("spoken").textContent =
    text ??
    (view.row < 0
      ? window
      : readingAt(view)
          .flatMap((group) => group.items)
          .filter((i) => ["md", "zone", "shmin", "pp", "sv", "stress_basis"].includes(i.id) && i.text !== "")
          .map((i) => `${i.label} ${i.text} ${i.unit}`)
          .join(", ") || depth.title);
}

function choose(kind, units) {
  view.change(kind, units);
  showUnits(store.units, view.units);
  for (const [name, value] of [
    ["depth", kind],
    ["units", units],
  ])
    document.querySelector(`input[name="${name}"][value="${value}"]`).checked = true;
  changed();
}

function go(topMd, baseMd) {
  const rows = [topMd, baseMd].map((si) => {
    const kind = view.kind;
    view.kind = "md";
    const row = view.nearest(view.fromSi(si));
    view.kind = kind;
    return row;
  });
  const { low } = view.depths();
  goTo(view, [Math.min(...rows.map((r) => low[r])), Math.max(...rows.map((r) => low[r]))]);
  view.row = Math.round((rows[0] + rows[1]) / 2);
  changed();
  element("viewer").scrollIntoView({ block: "start" });
  stage.focus({ preventScroll: true });
  speak();
}

document.documentElement.classList.add("live");
for (const input of document.querySelectorAll('input[name="depth"]')) input.addEventListener("change", () => choose(input.value, view.units));
for (const input of document.querySelectorAll('input[name="units"]')) {
  input.checked = input.value === view.units;
  input.addEventListener("change", () => choose(view.kind, input.value));
}
for (const track of store.tracks) {
  const [label, box] = [document.createElement("label"), document.createElement("input")];
  box.type = "checkbox";
  box.checked = track.shown;
  box.addEventListener("change", () => {
    if (box.checked) view.shown.add(track.id);
    else view.shown.delete(track.id);
    changed();
  });
  label.append(box, ` ${track.title}`);
  element("track-choice").append(label);
}
for (const [id, act] of [
  ["closer", () => view.zoom(0.6)],
  ["wider", () => view.zoom(1 / 0.6)],
  ["all", () => view.whole()],
]) {
  element(id).addEventListener("click", () => {
    act();
    changed();
    speak();
  });
}
listen(
  stage,
  canvas,
  view,
  () => layout,
  changed,
  () => speak(),
);
enliven(go, () => view.units, speak);
fillLegend(element("legend"), store, ink());
new ResizeObserver(() => changed()).observe(stage);
matchMedia("(prefers-color-scheme: dark)").addEventListener("change", () => {
  fillLegend(element("legend"), store, ink());
  changed();
});
view.row = store.start ?? -1;
element("values").classList.toggle("ranges", store.perRow > 1);
paint();
const firstDrawn = performance.now();

/** What the page shows, for checks from outside: geometry, readings, drawn extremes. */
window.depthStress = {
  geometry: () => ({
    kind: view.kind,
    units: view.units,
    top: view.top,
    base: view.base,
    plotTop: layout.top,
    plotBase: layout.base,
    width: layout.width,
    tracks: layout.tracks.map((p) => ({ id: p.track.id, left: p.left, right: p.right, top: layout.top, base: layout.base })),
    zones: store.zones.map((z) => ({ name: z.name, screen: view.span(z).map((d) => screenOf(layout, view, d)) })),
    zoneStrip: layout.zones,
    layerStrip: layout.layers,
    depthStrip: layout.depth,
  }),
  drawn: () => drawn,
  marks: () => marks,
  polygon: () => ({ mark: polygon, ...stateAt(view)?.limits }),
  firstDrawn,
  point(row) {
    view.point(row);
    paint();
  },
  reading: () =>
    Object.fromEntries(
      readingAt(view)
        .flatMap((group) => group.items)
        .map((i) => [i.id, i.text]),
    ),
  rows: store.rows,
  csv: (id) => csvOf(element(id), view.units),
};
