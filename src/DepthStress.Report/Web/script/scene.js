import { layOut, screenOf } from "./layout.js";
import { ink, line, paintFrame, paintHead } from "./paint.js";
import { paintCurve, paintRibbon } from "./curves.js";
import { paintLayers, paintObservations } from "./marks.js";

/** The canvas: tracks and marks on a sheet that is painted anew only when what it shows changes, and over it the crosshair and a chosen interval. */
export class Scene {
  constructor(stage, canvas, view) {
    Object.assign(this, { stage, canvas, view, layout: null, drawn: [], marks: [], painted: "" });
    this.sheet = document.createElement("canvas");
    // From this width on the reading stands beside the tracks.
    this.beside = matchMedia("(min-width: 1700px)");
  }

  paint(selection) {
    const { view, canvas } = this;
    const [width, height] = [this.stage.clientWidth, Math.max(420, Math.min(window.innerHeight - (this.beside.matches ? 190 : 380), 1400))];
    const [colours, dense] = [ink(), window.devicePixelRatio || 1];
    const shows = [width, height, dense, colours.named("paper"), view.kind, view.units, view.top, view.base, ...view.shown].join();
    if (shows !== this.painted) {
      this.paintSheet(width, height, dense, colours);
      this.painted = shows;
    }
    const g = canvas.getContext("2d");
    g.setTransform(1, 0, 0, 1, 0, 0);
    g.drawImage(this.sheet, 0, 0);
    g.setTransform(dense, 0, 0, dense, 0, 0);
    this.paintChoice(g, selection, colours);
    this.paintCrosshair(g, colours);
  }

  paintSheet(width, height, dense, colours) {
    const { view, sheet, canvas } = this;
    const g = sheet.getContext("2d");
    g.font = "11px sans-serif";
    const layout = layOut(view, width, height, (text) => g.measureText(text).width * 1.1);
    this.layout = layout;
    for (const each of [sheet, canvas]) [each.width, each.height] = [Math.round(layout.width * dense), Math.round(height * dense)];
    [canvas.style.width, canvas.style.height] = [`${layout.width}px`, `${height}px`];
    g.setTransform(dense, 0, 0, dense, 0, 0);
    g.fillStyle = colours.named("paper");
    g.fillRect(0, 0, layout.width, height);
    paintFrame(g, layout, view, colours);
    for (const place of layout.tracks) paintHead(g, layout, view, place, colours);
    paintLayers(g, layout, view, colours);
    this.drawn = layout.tracks.flatMap((place) =>
      place.track.curves.map((c) => ({ track: place.track.id, ...paintCurve(g, layout, view, place, c, colours) })),
    );
    for (const ribbon of layout.tracks.flatMap((p) => p.ribbons)) paintRibbon(g, layout, view, ribbon, colours);
    this.marks = paintObservations(g, layout, view, colours);
  }

  /** The right edge of the last track. */
  right() {
    return this.layout.tracks.at(-1)?.right ?? this.layout.width;
  }

  paintChoice(g, selection, colours) {
    if (!selection) return;
    const [a, b] = selection.map((d) => screenOf(this.layout, this.view, d)).sort((p, q) => p - q);
    g.globalAlpha = 0.2;
    g.fillStyle = colours.named("link");
    g.fillRect(0, a, this.right(), b - a);
    g.globalAlpha = 1;
  }

  /** Not through the names of zones and layers. */
  paintCrosshair(g, colours) {
    const { layout, view } = this;
    const y = view.row < 0 ? NaN : screenOf(layout, view, view.depths().low[view.row]);
    if (!(y >= layout.top && y <= layout.base)) return;
    line(g, layout.depth[0], y, layout.depth[1], y, colours.named("mark"), 1);
    line(g, layout.layers[1], y, this.right(), y, colours.named("mark"), 1);
  }

  /** The ends of each curve's scale by track and column, for checks from outside. */
  scales() {
    const curves = this.view.tracks().flatMap((track) => track.curves.map((c) => [`${track.id}/${c.column}`, c[this.view.units]]));
    return Object.fromEntries(curves.map(([name, { left, right }]) => [name, [left, right]]));
  }

  /** Where everything lies, for checks from outside. */
  geometry() {
    const { layout, view } = this;
    return {
      kind: view.kind,
      units: view.units,
      top: view.top,
      base: view.base,
      plotTop: layout.top,
      plotBase: layout.base,
      width: layout.width,
      tracks: layout.tracks.map((p) => ({ id: p.track.id, left: p.left, right: p.right, top: layout.top, base: layout.base })),
      zones: view.store.zones.map((z) => ({ name: z.name, screen: view.span(z).map((d) => screenOf(layout, view, d)) })),
      zoneStrip: layout.zones,
      layerStrip: layout.layers,
      depthStrip: layout.depth,
    };
  }
}
