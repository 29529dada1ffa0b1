import { depthOf } from "./layout.js";

const CLOSER = 0.8;

/** Wheel, drag, click and keys on the tracks; every change ends in `changed`. */
export function listen(stage, canvas, view, layoutOf, changed, speak) {
  let [drag, chosen] = [null, null];
  const place = (event) => {
    const box = canvas.getBoundingClientRect();
    return [event.clientX - box.left, event.clientY - box.top];
  };
  const at = (y) => depthOf(layoutOf(), view, y);
  const inside = ([x, y], [left, right]) => x >= left && x < right && y >= layoutOf().top;

  canvas.addEventListener(
    "wheel",
    (event) => {
      const widens = event.deltaY > 0;
      // At the whole log a further turn scrolls the page.
      if (event.ctrlKey || (widens && view.isWhole() && !event.shiftKey)) return;
      event.preventDefault();
      if (event.shiftKey) view.move(((view.base - view.top) / 8) * Math.sign(event.deltaY || event.deltaX));
      else view.zoom(widens ? 1 / CLOSER : CLOSER, at(place(event)[1]));
      changed();
    },
    { passive: false },
  );

  canvas.addEventListener("pointerdown", (event) => {
    if (event.button !== 0) return;
    const [x, y] = place(event);
    drag = { y, from: y, selects: inside([x, y], layoutOf().depth), moved: false };
    canvas.setPointerCapture(event.pointerId);
  });
  canvas.addEventListener("pointermove", (event) => {
    const [, y] = place(event);
    if (drag) {
      drag.moved ||= Math.abs(y - drag.from) > 3;
      if (drag.selects) chosen = [at(drag.from), at(y)];
      else if (drag.moved) view.move(at(drag.y) - at(y));
      drag.y = y;
    }
    if (y >= layoutOf().top && y <= layoutOf().base) view.row = view.nearest(at(y));
    changed(chosen);
  });
  canvas.addEventListener("pointerup", (event) => {
    const here = place(event);
    if (drag?.selects && drag.moved) view.show(Math.min(...chosen), Math.max(...chosen));
    else if (drag && !drag.moved) click(here);
    [drag, chosen] = [null, null];
    changed();
  });
  canvas.addEventListener("pointercancel", () => {
    [drag, chosen] = [null, null];
    changed();
  });
  canvas.addEventListener("dblclick", () => {
    view.whole();
    changed();
  });

  function click(here) {
    for (const [items, strip] of [
      [view.store.zones, layoutOf().zones],
      [view.store.layers, layoutOf().layers],
    ]) {
      if (!inside(here, strip)) continue;
      const depth = at(here[1]);
      const item = items.find((i) => view.span(i)[0] <= depth && depth < view.span(i)[1]);
      if (item) goTo(view, view.span(item));
    }
  }

  stage.addEventListener("keydown", (event) => {
    const window = view.base - view.top;
    const rows = event.shiftKey ? 10 : 1;
    const start = () => (view.row < 0 ? view.nearest((view.top + view.base) / 2) : view.row);
    const keys = {
      ArrowDown: () => view.point(start() + rows),
      ArrowUp: () => view.point(Math.max(0, start() - rows)),
      PageDown: () => view.move(window * 0.9),
      PageUp: () => view.move(-window * 0.9),
      Home: () => view.point(0),
      End: () => view.point(view.store.rows - 1),
      "+": () => view.zoom(CLOSER),
      "=": () => view.zoom(CLOSER),
      "-": () => view.zoom(1 / CLOSER),
      0: () => view.whole(),
      Escape: () => view.point(-1),
    };
    if (!keys[event.key] || event.ctrlKey || event.metaKey || event.altKey) return;
    event.preventDefault();
    keys[event.key]();
    changed();
    speak();
  });
}

/** Shows an interval with a little of what lies around it. */
export function goTo(view, [top, base]) {
  const around = Math.max((base - top) * 0.06, (view.limits()[1] - view.limits()[0]) * 1e-3);
  view.show(top - around, base + around);
}
