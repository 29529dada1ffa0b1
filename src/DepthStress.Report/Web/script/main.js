import { readStore } from "./store.js";
import { View } from "./view.js";
import { ink } from "./paint.js";
import { fillLegend } from "./marks.js";
import { Scene } from "./scene.js";
import { fillReading, readingAt } from "./reading.js";
import { fillPolygon, stateAt } from "./polygon.js";
import { goTo, listen } from "./input.js";
import { csvOf, enliven, showUnits } from "./tables.js";

const element = (id) => document.getElementById(id);
const store = readStore(element("data").textContent);
const view = new View(store);
const [stage, canvas] = [element("stage"), element("tracks")];
const scene = new Scene(stage, canvas, view);
let [polygon, waiting, selection] = [null, false, null];

function paint() {
  waiting = false;
  scene.paint(selection);
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
  () => scene.layout,
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
  geometry: () => scene.geometry(),
  drawn: () => scene.drawn,
  scales: () => scene.scales(),
  marks: () => scene.marks,
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
