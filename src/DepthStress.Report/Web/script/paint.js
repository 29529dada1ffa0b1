import { endText, roundStep, stepText } from "./numbers.js";
import { FONT, screenOf } from "./layout.js";

/** Colours of the style sheet, so that light, dark and print differ there alone. */
export function ink() {
  const style = getComputedStyle(document.documentElement);
  const named = (name) => style.getPropertyValue(`--${name}`).trim();
  return { named, curve: (hex) => named(`c-${hex}`) || `#${hex}` };
}

export function write(g, text, x, y, { size = 11, align = "left", bold = false, colour, width } = {}) {
  g.font = `${bold ? 600 : 400} ${size}px ${FONT}`;
  g.textAlign = align;
  g.textBaseline = "middle";
  g.fillStyle = colour;
  g.fillText(fit(g, text, width), x, y);
}

function fit(g, text, width) {
  if (!width || g.measureText(text).width <= width) return text;
  let short = text;
  while (short.length > 1 && g.measureText(`${short}\u2026`).width > width) short = short.slice(0, -1);
  return `${short.trimEnd()}\u2026`;
}

/** A title cut at a blank so that each line is as short as can be; one line where it fits. */
function twoLines(g, text, width) {
  g.font = `600 11px ${FONT}`;
  if (g.measureText(text).width <= width) return [text];
  const words = text.split(" ");
  const cuts = words.slice(1).map((_, i) => [words.slice(0, i + 1).join(" "), words.slice(i + 1).join(" ")]);
  const wide = (parts) => Math.max(...parts.map((t) => g.measureText(t).width));
  return cuts.length === 0 ? [text] : cuts.reduce((best, cut) => (wide(cut) < wide(best) ? cut : best));
}

export function line(g, x1, y1, x2, y2, colour, width = 1) {
  g.strokeStyle = colour;
  g.lineWidth = width;
  g.beginPath();
  g.moveTo(x1, y1);
  g.lineTo(x2, y2);
  g.stroke();
}

/** The depth scale, the zones with their bands across all tracks, the layers. */
export function paintFrame(g, layout, view, colours) {
  const [text, faint, grid, edge] = ["text", "faint", "grid", "edge"].map(colours.named);
  const names = { md: "MD", tvd: "TVD", tvdss: "TVDSS" };
  const right = layout.tracks.length ? layout.tracks.at(-1).right : layout.layers[1];
  write(g, names[view.kind], layout.depth[1] - 8, layout.top - 24, { align: "right", bold: true, colour: text });
  write(g, view.depthUnit().unit, layout.depth[1] - 8, layout.top - 10, { align: "right", colour: faint });
  paintSpans(g, layout, view, view.store.zones, layout.zones, right, colours, "Zone");
  const step = roundStep(view.base - view.top, (layout.base - layout.top) / 44);
  for (let i = Math.ceil(view.top / step - 1e-9); i * step <= view.base + step * 1e-9; i++) {
    const y = screenOf(layout, view, i * step);
    line(g, layout.layers[1], y, right, y, grid);
    line(g, layout.depth[1] - 5, y, layout.depth[1], y, edge);
    const place = Math.min(Math.max(y, layout.top + 6), layout.base - 6);
    write(g, stepText(i * step, step), layout.depth[1] - 8, place, { align: "right", colour: text });
  }
  paintSpans(g, layout, view, view.store.layers, layout.layers, 0, colours, "Layer");
  line(g, layout.depth[1], layout.top, layout.depth[1], layout.base, edge);
}

function paintSpans(g, layout, view, items, [left, end], right, colours, title) {
  if (items.length === 0) return;
  const [text, edge, band, paper] = ["text", "edge", "band", "paper"].map(colours.named);
  write(g, title, (left + end) / 2, layout.top - 10, { align: "center", bold: true, size: 10, width: end - left - 2, colour: text });
  items.forEach((item, i) => {
    const [a, b] = view.span(item).map((d) => Math.min(Math.max(screenOf(layout, view, d), layout.top), layout.base));
    if (!(b > a)) return;
    g.fillStyle = i % 2 === 0 ? band : paper;
    g.fillRect(left, a, (right || end) - left, b - a);
    line(g, left, a, end, a, edge, 0.6);
    if (b - a >= 12) write(g, item.name, (left + end) / 2, (a + b) / 2, { align: "center", size: 11, width: end - left - 4, colour: text });
  });
}

/** The head of a track: for each curve its name, its pen, the scale's ends and the unit. */
export function paintHead(g, layout, view, place, colours) {
  const [text, faint, frame, grid] = ["text", "faint", "edge", "grid"].map(colours.named);
  const { left, right, track } = place;
  const middle = (left + right) / 2;
  twoLines(g, track.title, right - left + 4).forEach((part, i) =>
    write(g, part, middle, 11 + 13 * i, { align: "center", bold: true, size: 11, width: right - left + 4, colour: text }),
  );
  track.curves.forEach((curve, i) => {
    const y = layout.top - 5 - layout.row * (track.curves.length - i);
    const scale = curve[view.units];
    const pen = colours.curve(curve.colour);
    // The label gives way, the count of what is off the scale does not.
    const off = scale.off > 0 ? ` (${scale.off} off)` : "";
    g.font = `400 10px ${FONT}`;
    write(g, fit(g, curve.label, right - left - g.measureText(off).width) + off, middle, y + 7, { align: "center", size: 10, colour: text });
    g.setLineDash(curve.dash.map((d) => d * 1.5));
    line(g, left, y + 15, right, y + 15, pen, curve.width + 1);
    g.setLineDash([]);
    write(g, endText(scale.left), left + 1, y + 23, { size: 10, colour: faint });
    write(g, view.store.columns.get(curve.column).unit(view.units).unit, middle, y + 23, { align: "center", size: 10, colour: faint });
    write(g, endText(scale.right), right - 1, y + 23, { align: "right", size: 10, colour: faint });
  });
  const parts = track.curves[0][view.units].divisions;
  for (let i = 1; i < parts; i++) {
    const x = left + ((right - left) * i) / parts;
    line(g, x, layout.top, x, layout.base, grid);
  }
  g.strokeStyle = frame;
  g.lineWidth = 1;
  g.strokeRect(left, layout.top, right - left, layout.base - layout.top);
}
