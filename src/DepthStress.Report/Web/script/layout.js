const DEPTH = 58;
const GAP = 6;
const LEAST = 88;
const RIBBON = 6;
const ROW = 27;

export const FONT = "system-ui, 'Helvetica Neue', Arial, 'Liberation Sans', sans-serif";

/** Where everything lies on the canvas, in CSS pixels: one set of plot top and base for all tracks. */
export function layOut(view, width, height, measure) {
  const tracks = view.tracks();
  const names = view.store.zones.map((z) => measure(z.name));
  const zones = names.length === 0 ? 0 : Math.min(110, Math.max(40, Math.max(...names) + 12));
  const layers = view.store.layers.length === 0 ? 0 : 38;
  const left = DEPTH + zones + layers + GAP;
  const ribbons = tracks.map((t) => t.curves.filter((c) => c.origin));
  const across = Math.max(LEAST, (width - left - GAP * tracks.length) / Math.max(1, tracks.length));
  const head = 38 + ROW * Math.max(1, ...tracks.map((t) => t.curves.length));
  let x = left;
  const places = tracks.map((track, i) => {
    const place = { track, left: x, right: x + across - ribbons[i].length * (RIBBON + 2), ribbons: [] };
    place.ribbons = ribbons[i].map((curve, k) => ({ curve, left: place.right + 2 + k * (RIBBON + 2), width: RIBBON }));
    x += across + GAP;
    return place;
  });
  return {
    width: Math.max(width, x),
    height,
    top: head,
    base: height - 8,
    row: ROW,
    depth: [0, DEPTH],
    zones: [DEPTH, DEPTH + zones],
    layers: [DEPTH + zones, DEPTH + zones + layers],
    tracks: places,
  };
}

/** The screen height of a depth. */
export function screenOf(layout, view, depth) {
  return layout.top + ((depth - view.top) / (view.base - view.top)) * (layout.base - layout.top);
}

/** The depth at a screen height. */
export function depthOf(layout, view, y) {
  return view.top + ((y - layout.top) / (layout.base - layout.top)) * (view.base - view.top);
}
