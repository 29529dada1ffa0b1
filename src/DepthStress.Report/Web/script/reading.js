/** What stands at the crosshair, as lists: depths and words first, then every track that is shown. */
export function readingAt(view) {
  if (view.row < 0) return [];
  const { store, row, units } = view;
  const number = (id, label) => {
    const column = store.columns.get(id);
    return { id, label, text: column.text(row, units), unit: column.unit(units).unit };
  };
  const kinds = { md: "MD", tvd: "TVD", tvdss: "TVDSS" };
  const names = { regime: "regime", stress_basis: "stress rests on" };
  const place = Object.entries(kinds)
    .filter(([id]) => store.columns.has(id))
    .map(([id, label]) => number(id, label));
  const words = [...store.words.values()]
    .filter((w) => w.any && !w.id.endsWith("_origin"))
    .map((w) => ({ id: w.id, label: names[w.id] ?? w.title, text: w.at(row), unit: "" }));
  const tracks = view.tracks().map((track) => ({
    title: track.title,
    items: track.curves.flatMap((c) => {
      const items = [number(c.column, c.label)];
      if (c.origin) items.push({ id: c.origin, label: `${c.label}: origin`, text: store.words.get(c.origin).at(row), unit: "" });
      return items;
    }),
  }));
  return [{ title: "Depth", items: place }, { title: "Place and basis", items: words }, ...tracks].filter((group) => group.items.length > 0);
}

/** Fills the panel; everything is set as text. */
export function fillReading(panel, groups) {
  if (groups.length === 0) {
    const hint = document.createElement("p");
    hint.className = "small";
    hint.textContent = "Move over the tracks, or press an arrow key on them.";
    panel.replaceChildren(hint);
    return;
  }
  panel.replaceChildren(
    ...groups.map((group) => {
      const part = document.createElement("section");
      const title = document.createElement("h4");
      title.textContent = group.title;
      const list = document.createElement("dl");
      for (const item of group.items) {
        const [name, value, unit] = ["dt", "dd", "dd"].map((tag) => document.createElement(tag));
        name.textContent = item.label;
        value.textContent = item.text === "" ? "\u2013" : item.text;
        value.dataset.id = item.id;
        unit.textContent = item.text === "" ? "" : item.unit;
        unit.className = "unit";
        if (item.unit === "") value.className = "word";
        list.append(...(item.unit === "" ? [name, value] : [name, value, unit]));
      }
      part.append(title, list);
      return part;
    }),
  );
}
