import { convert, digitsText, digitsValue, fixedText } from "./numbers.js";

function unitOf(text) {
  const [unit, factor, offset, decimals, suffix] = text.split("|");
  return { unit, factor: Number(factor), offset: Number(offset), decimals: Number(decimals), suffix };
}

const isNumber = (head) => head.dataset.metric !== undefined;

/** Shows the numbers of all tables in a unit system, converted from their printed digits. */
export function showUnits(own, units) {
  for (const table of document.querySelectorAll("table")) {
    [...table.tHead.rows[0].cells].forEach((head, k) => {
      if (!isNumber(head)) return;
      const [from, to] = [unitOf(head.dataset[own]), unitOf(head.dataset[units])];
      head.querySelector(".unit").textContent = to.unit;
      for (const row of table.tBodies[0].rows) {
        const cell = row.cells[k];
        const digits = cell.dataset.n === "" ? NaN : Number(cell.dataset.n);
        const text =
          own === units ? digitsText(digits, from.decimals) : fixedText(convert(digitsValue(digits, from.decimals), from, to), to.decimals);
        (cell.querySelector("button, span") ?? cell).textContent = text;
      }
    });
  }
}

/** Makes headings buttons that sort, row heads buttons that go to their depths, and adds a button that copies. */
export function enliven(go, unitsNow, speak) {
  for (const table of document.querySelectorAll("table")) {
    [...table.tHead.rows[0].cells].forEach((head, k) => {
      const button = document.createElement("button");
      button.type = "button";
      button.className = "order";
      button.append(...head.childNodes);
      button.addEventListener("click", () => sort(table, head, k));
      head.append(button);
    });
    for (const span of table.querySelectorAll("span[data-top]")) span.replaceWith(link(span, go));
    const copy = document.createElement("button");
    copy.type = "button";
    copy.className = "copy";
    copy.textContent = "Copy as CSV";
    copy.setAttribute("aria-label", `Copy as CSV: ${table.caption.textContent}`);
    copy.addEventListener("click", async () => {
      const done = await copyText(csvOf(table, unitsNow()));
      copy.textContent = done ? "Copied" : "Copying was refused";
      speak(copy.textContent);
      setTimeout(() => {
        copy.textContent = "Copy as CSV";
      }, 2000);
    });
    table.closest(".sheet").before(copy);
  }
}

function link(span, go) {
  const button = document.createElement("button");
  button.type = "button";
  button.className = "go";
  button.textContent = span.textContent;
  button.title = "show this interval on the tracks";
  button.addEventListener("click", () => go(Number(span.dataset.top), Number(span.dataset.base)));
  return button;
}

function sort(table, head, k) {
  const down = head.getAttribute("aria-sort") === "ascending";
  for (const other of table.tHead.rows[0].cells) other.removeAttribute("aria-sort");
  head.setAttribute("aria-sort", down ? "descending" : "ascending");
  const key = (row) => {
    const cell = row.cells[k];
    if (!isNumber(head)) return cell.textContent;
    return cell.dataset.n === "" ? NaN : Number(cell.dataset.n);
  };
  // Empty cells stay at the end, whichever way the rest goes.
  const compare = (a, b) => (typeof a === "string" ? a.localeCompare(b, "en") : a - b);
  const empty = (v) => v === "" || Number.isNaN(v);
  const rows = [...table.tBodies[0].rows].map((row) => ({ row, value: key(row) }));
  rows.sort((p, q) => (empty(p.value) || empty(q.value) ? empty(p.value) - empty(q.value) : (down ? -1 : 1) * compare(p.value, q.value)));
  table.tBodies[0].append(...rows.map((r) => r.row));
}

/** The table as CSV in the order and units it is shown in. */
export function csvOf(table, units) {
  const field = (text) => {
    const safe = /^\s*[=+\-@]/.test(text) && Number.isNaN(Number(text)) ? `'${text}` : text;
    return /[",\n]/.test(safe) || safe.trim() !== safe ? `"${safe.replaceAll('"', '""')}"` : safe;
  };
  const names = [...table.tHead.rows[0].cells].map((head) => {
    const suffix = isNumber(head) ? unitOf(head.dataset[units]).suffix : "";
    return suffix ? `${head.dataset.id}_${suffix}` : head.dataset.id;
  });
  const rows = [...table.tBodies[0].rows].map((row) => [...row.cells].map((cell) => field(cell.textContent)));
  return [names, ...rows].map((cells) => `${cells.join(",")}\n`).join("");
}

async function copyText(text) {
  try {
    await navigator.clipboard.writeText(text);
    return true;
  } catch {
    const area = document.createElement("textarea");
    area.value = text;
    document.body.append(area);
    area.select();
    const done = document.execCommand("copy");
    area.remove();
    return done;
  }
}
