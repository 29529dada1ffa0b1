import assert from "node:assert/strict";
import { createRequire } from "node:module";
import { readFileSync } from "node:fs";
import { join } from "node:path";
import { after, before, test } from "node:test";
import { chromium } from "playwright-core";
import { pagesOf, runWells, table } from "./wells.js";

const PSI = 6894.757293168361; // Pa in a psi, NIST SP 811 (2008)
const axe = readFileSync(createRequire(import.meta.url).resolve("axe-core/axe.min.js"), "utf8");
let [wells, browser] = [null, null];

before(async () => {
  wells = runWells();
  browser = await chromium.launch({ executablePath: process.env.CHROMIUM ?? "/usr/bin/chromium", args: ["--no-sandbox"] });
});
after(async () => {
  await browser?.close();
  wells?.remove();
});

/** Opens a well's page; `troubles` gets console errors, faults and every request that leaves the file. */
async function open(well, { width = 1280, height = 900, ...options } = {}) {
  const context = await browser.newContext({ viewport: { width, height }, ...options });
  const page = await context.newPage();
  const troubles = [];
  page.on("console", (m) => ["error", "warning"].includes(m.type()) && troubles.push(m.text()));
  page.on("pageerror", (e) => troubles.push(e.message));
  page.on("request", (r) => !r.url().startsWith("data:") && r.url() !== wells.page(well) && troubles.push(r.url()));
  await page.goto(wells.page(well));
  if (options.javaScriptEnabled !== false) await page.waitForFunction(() => window.depthStress);
  return { page, troubles, close: () => context.close() };
}

const geometry = (page) =>
  page.evaluate(() => new Promise((done) => requestAnimationFrame(() => requestAnimationFrame(() => done(window.depthStress.geometry())))));
const canvasAt = async (page, x, y) => {
  await page.locator("#stage").scrollIntoViewIfNeeded();
  const box = await page.locator("#tracks").boundingBox();
  return [box.x + x, box.y + y];
};

function aligned(g) {
  for (const track of g.tracks) {
    assert.equal(track.top, g.plotTop);
    assert.equal(track.base, g.plotBase);
  }
  for (let i = 1; i < g.tracks.length; i++) assert.ok(g.tracks[i].left > g.tracks[i - 1].right, "tracks stand side by side");
}

for (const well of ["quillback-4", "field", "tiny", "many"]) {
  test(`${well}: opens from a file without a console error or a request`, async () => {
    const { page, troubles, close } = await open(well);
    await page.waitForTimeout(300);
    assert.deepEqual(troubles, []);
    assert.ok((await page.evaluate(() => window.depthStress.drawn())).length > 0);
    await close();
  });
}

for (const [well, name] of [
  ["quillback-4", "metric"],
  ["field", "field"],
]) {
  test(`the crosshair shows the digits of depth.csv at ten depths, ${name} units`, async () => {
    const { page, close } = await open(well);
    const rows = table(wells.folder, well, "depth.csv");
    for (const share of [0, 0.08, 0.21, 0.29, 0.37, 0.5, 0.62, 0.77, 0.9, 1]) {
      const row = Math.round(share * (rows.length - 1));
      const shown = await page.evaluate((i) => {
        window.depthStress.point(i);
        return window.depthStress.reading();
      }, row);
      let compared = 0;
      for (const [column, cell] of Object.entries(rows[row])) {
        const id = Object.keys(shown)
          .filter((k) => column === k || column.startsWith(`${k}_`))
          .sort((a, b) => b.length - a.length)[0];
        if (!id || !sameColumn(column, id)) continue;
        assert.equal(shown[id], cell, `${column} in row ${row}`);
        const visible = await page.locator(`#values dd[data-id="${id}"]`).first().textContent();
        assert.equal(visible, cell === "" ? "\u2013" : cell);
        compared++;
      }
      assert.ok(compared >= 20, `${compared} columns compared`);
    }
    await close();
  });
}

const UNITS = /^(m|ft|m_s|ft_s|g_cm3|gpa|mpsi|mpa|psi|deg|us_ft|kpa_m|psi_ft|lb_gal|ppg)$/;
const sameColumn = (column, id) => column === id || UNITS.test(column.slice(id.length + 1));

test("wheel and drag move all tracks together and keep the depth under the pointer", async () => {
  const { page, close } = await open("quillback-4");
  const first = await geometry(page);
  aligned(first);
  const y = first.plotTop + 0.3 * (first.plotBase - first.plotTop);
  const depthAt = (g, at) => g.top + ((at - g.plotTop) / (g.plotBase - g.plotTop)) * (g.base - g.top);
  await page.mouse.move(...(await canvasAt(page, first.tracks[2].left + 20, y)));
  for (let i = 0; i < 5; i++) await page.mouse.wheel(0, -100);
  const near = await geometry(page);
  aligned(near);
  assert.ok(near.base - near.top < 0.5 * (first.base - first.top));
  const pixel = (first.base - first.top) / (first.plotBase - first.plotTop);
  assert.ok(Math.abs(depthAt(near, y) - depthAt(first, y)) < pixel, "within a pixel line: the pointer lies on whole ones");
  await page.mouse.down();
  await page.mouse.move(...(await canvasAt(page, first.tracks[2].left + 20, y + 60)), { steps: 6 });
  await page.mouse.up();
  const moved = await geometry(page);
  aligned(moved);
  assert.ok(Math.abs(moved.base - moved.top - (near.base - near.top)) < 1e-6, "the same height, but for rounding");
  assert.ok(moved.top < near.top);
  await page.mouse.dblclick(...(await canvasAt(page, first.tracks[0].left + 20, y)));
  const back = await geometry(page);
  assert.deepEqual([back.top, back.base], [first.top, first.base]);
  await close();
});

test("a drag on the depth scale, a click on a zone and one on a layer's row go there", async () => {
  const { page, close } = await open("quillback-4");
  const g = await geometry(page);
  const x = (g.depthStrip[0] + g.depthStrip[1]) / 2;
  await page.mouse.move(...(await canvasAt(page, x, g.plotTop + 100)));
  await page.mouse.down();
  await page.mouse.move(...(await canvasAt(page, x, g.plotTop + 200)), { steps: 4 });
  await page.mouse.up();
  const chosen = await geometry(page);
  assert.ok(
    Math.abs((chosen.base - chosen.top) / (g.base - g.top) - 100 / (g.plotBase - g.plotTop)) < 0.01,
    "100 lines of the plot, within a line or two",
  );
  await page.click("#all");
  const zone = g.zones[2];
  await page.mouse.click(...(await canvasAt(page, (g.zoneStrip[0] + g.zoneStrip[1]) / 2, (zone.screen[0] + zone.screen[1]) / 2)));
  const there = await geometry(page);
  const [top, base] = there.zones[2].screen;
  assert.ok(top >= there.plotTop && base <= there.plotBase && base - top > 0.8 * (there.plotBase - there.plotTop));
  await page.locator("#layers tbody tr").nth(4).locator("button.go").click();
  const layer = table(wells.folder, "quillback-4", "layers.csv")[4];
  const last = await geometry(page);
  assert.ok(last.top < Number(layer.top_md_m) && last.base > Number(layer.base_md_m) - 0.2);
  assert.ok(last.base - last.top < 1.3 * Number(layer.thickness_md_m));
  const { md } = await page.evaluate(() => window.depthStress.reading());
  assert.ok(Number(md) > Number(layer.top_md_m) && Number(md) < Number(layer.base_md_m), "the crosshair stands in the layer");
  await close();
});

test("depth kinds and units switch right, in tracks, crosshair and tables", async () => {
  const { page, close } = await open("quillback-4");
  const rows = table(wells.folder, "quillback-4", "depth.csv");
  const row = 9000;
  await page.evaluate((i) => window.depthStress.point(i), row);
  for (const kind of ["tvd", "tvdss", "md"]) {
    await page.check(`input[name="depth"][value="${kind}"]`);
    const g = await geometry(page);
    aligned(g);
    const values = rows.map((r) => Number(r[`${kind}_m`]));
    assert.equal(g.kind, kind);
    assert.deepEqual([g.top, g.base], [Math.min(...values), Math.max(...values)]);
  }
  await page.check('input[name="units"][value="field"]');
  const g = await geometry(page);
  assert.ok(Math.abs(g.top - Number(rows[0].md_m) / 0.3048) < 1e-6, "the foot is 0.3048 m exactly; doubles round");
  const shown = await page.evaluate(() => window.depthStress.reading());
  assert.equal(shown.shmin, ((Number(rows[row].shmin_mpa) * 1e6) / PSI).toFixed(1));
  assert.equal(shown.md, (Number(rows[row].md_m) / 0.3048).toFixed(4));
  assert.equal(shown.density, rows[row].density_g_cm3);
  const cell = async (n) => page.locator("#layers tbody tr").first().locator("td").nth(n).textContent();
  const layer = table(wells.folder, "quillback-4", "layers.csv")[0];
  assert.equal(await cell(1), (Math.round(Number(layer.top_md_m) * 10) / 10 / 0.3048).toFixed(1));
  await page.check('input[name="units"][value="metric"]');
  assert.equal(await cell(1), Number(layer.top_md_m).toFixed(1));
  await close();
});

test("tables sort both ways and copy as CSV in the order shown", async () => {
  const { page, close } = await open("quillback-4", { permissions: ["clipboard-read", "clipboard-write"] });
  const head = page.locator('#layers th[data-id="shmin_mean"]');
  const column = async () => {
    const csv = (await page.evaluate(() => window.depthStress.csv("layers")))
      .trimEnd()
      .split("\n")
      .map((l) => l.split(","));
    return csv.slice(1).map((cells) => Number(cells[csv[0].indexOf("shmin_mean_mpa")]));
  };
  await head.locator("button").click();
  assert.equal(await head.getAttribute("aria-sort"), "ascending");
  const up = await column();
  assert.deepEqual(
    up,
    [...up].sort((a, b) => a - b),
  );
  await head.locator("button").click();
  const down = await column();
  assert.deepEqual(down, [...up].reverse());
  assert.deepEqual(
    up,
    table(wells.folder, "quillback-4", "layers.csv")
      .map((l) => Number(Number(l.shmin_mean_mpa).toFixed(2)))
      .sort((a, b) => a - b),
  );
  await page.getByRole("button", { name: "Copy as CSV: Layers: means" }).click();
  await page.getByText("Copied", { exact: true }).first().waitFor();
  assert.equal(await page.evaluate(() => navigator.clipboard.readText()), await page.evaluate(() => window.depthStress.csv("layers")));
  await close();
});

test("a mnemonic and a name with markup stay text", async () => {
  const { page, troubles, close } = await open("tiny");
  page.on("dialog", (d) => {
    troubles.push(d.message());
    return d.dismiss();
  });
  assert.equal(await page.locator("h1").textContent(), "Tiny <b>well</b>");
  assert.match(await page.locator("#curves").textContent(), /<script>alert\(1\)<\/script>/);
  assert.equal(await page.locator("h1 b").count(), 0);
  assert.equal(await page.locator("main script").count(), 0);
  assert.deepEqual(troubles, []);
  await close();
});

test("drawn extremes of every curve are the data's; what lies off a scale is counted", async () => {
  const { page, close } = await open("quillback-4");
  const rows = table(wells.folder, "quillback-4", "depth.csv");
  await page.getByText("Tracks", { exact: true }).click();
  for (const box of await page.locator("#track-choice input").all()) await box.check();
  await geometry(page);
  const { drawn, scales } = await page.evaluate(() => ({ drawn: window.depthStress.drawn(), scales: window.depthStress.scales() }));
  let [compared, beyond] = [0, 0];
  for (const curve of drawn) {
    const name = Object.keys(rows[0]).find(
      (column) => column === curve.column || (column.startsWith(`${curve.column}_`) && sameColumn(column, curve.column)),
    );
    if (!name) continue;
    const values = rows
      .map((r) => r[name])
      .filter((v) => v !== "")
      .map(Number);
    assert.deepEqual([curve.least, curve.greatest], [Math.min(...values), Math.max(...values)], curve.column);
    const [low, high] = scales[`${curve.track}/${curve.column}`].sort((p, q) => p - q);
    const off = values.filter((v) => v < low || v > high).length;
    assert.equal(curve.off, off, `${curve.column} off ${low} to ${high}`);
    [compared, beyond] = [compared + 1, beyond + off];
  }
  assert.ok(compared >= 20, `${compared} curves compared`);
  assert.ok(drawn.find((d) => d.column === "caliper").off > 0, "washouts of the sample well lie beyond the scale of the caliper");
  await close();
});

test("many samples: the page says it shows bins, and one extreme sample is not lost", async () => {
  const { page, close } = await open("many");
  assert.match(await page.locator(".notice").first().textContent(), /bins of \d+ samples/);
  const density = (await page.evaluate(() => window.depthStress.drawn())).find((d) => d.column === "density");
  assert.equal(density.greatest, 2.9);
  const row = await page.evaluate(() => Math.floor(33333 / Math.ceil(50000 / 8000)));
  const shown = await page.evaluate((i) => {
    window.depthStress.point(i);
    return window.depthStress.reading();
  }, row);
  assert.match(shown.density, /^2\.\d{4} to 2\.9000$/);
  await close();
});

test("keys move the crosshair and the window", async () => {
  const { page, close } = await open("quillback-4");
  const rows = table(wells.folder, "quillback-4", "depth.csv");
  await page.focus("#stage");
  await page.keyboard.press("Home");
  for (const key of ["ArrowDown", "Shift+ArrowDown", "ArrowUp"]) await page.keyboard.press(key);
  assert.equal((await page.evaluate(() => window.depthStress.reading())).md, rows[10].md_m);
  assert.match(await page.locator("#spoken").textContent(), new RegExp(`MD ${rows[10].md_m} m`));
  const before = await geometry(page);
  await page.keyboard.press("+");
  const near = await geometry(page);
  assert.ok(near.base - near.top < before.base - before.top);
  await page.keyboard.press("PageDown");
  assert.ok((await geometry(page)).top > near.top);
  await page.keyboard.press("0");
  await page.keyboard.press("Escape");
  assert.deepEqual([(await geometry(page)).top, await page.evaluate(() => window.depthStress.reading())], [before.top, {}]);
  await close();
});

test("observations stand on the stress track with their error bars and meaning", async () => {
  const { page, close } = await open("quillback-4");
  const marks = await page.evaluate(() => window.depthStress.marks());
  const compared = table(wells.folder, "quillback-4", "observations.csv").filter((o) => o.residual !== "" && Number(o.base_md_m) >= 900.1);
  assert.equal(marks.length, compared.length);
  assert.ok(marks.every((m) => m.left < m.right && m.left <= m.x && m.x <= m.right));
  assert.deepEqual([...new Set(marks.map((m) => m.meaning))].sort(), [...new Set(compared.map((o) => o.meaning))].sort());
  await close();
});

test("the polygon at the crosshair is what friction allows there, and the model stands in it", async () => {
  for (const [well, unit, suffix] of [
    ["quillback-4", "MPa", "mpa"],
    ["field", "psi", "psi"],
  ]) {
    const { page, close } = await open(well);
    const rows = table(wells.folder, well, "depth.csv");
    // Jaeger and Cook; Zoback 2007, Reservoir Geomechanics: q = (sqrt(mu^2 + 1) + mu)^2, 3.12 for 0.6, the friction of the sample well.
    const q = (Math.sqrt(1.36) + 0.6) ** 2;
    assert.ok(Math.abs(q - 3.12) < 0.005);
    for (const share of [0.03, 0.2, 0.45, 0.7, 0.93]) {
      const row = Math.round(share * (rows.length - 1));
      await page.evaluate((i) => window.depthStress.point(i), row);
      const found = await page.evaluate(() => {
        const { mark, lowest, highest, friction } = window.depthStress.polygon();
        return { mark, lowest, highest, friction };
      });
      const [sv, pp, shmin, shmax] = ["sv", "pp", "shmin", "shmax"].map((id) => Number(rows[row][`${id}_${suffix}`]));
      assert.equal(found.friction, 0.6);
      assert.ok(Math.abs(found.lowest - (pp + (sv - pp) / q)) < 1e-9 * sv && Math.abs(found.highest - (pp + q * (sv - pp))) < 1e-9 * sv);
      const { mark } = found;
      const scale = (mark.right - mark.left) / (found.highest - found.lowest);
      assert.ok(Math.abs(mark.x - mark.left - (shmin - found.lowest) * scale) < 1e-6, "the mark stands at Shmin");
      assert.ok(Math.abs(mark.base - mark.y - (shmax - found.lowest) * scale) < 1e-6, "and at SHmax");
      const words = await page.locator("#polygon-words").textContent();
      assert.match(words, new RegExp(`^Friction 0\\.60: Shmin from ${found.lowest.toFixed(unit === "MPa" ? 2 : 0)} ${unit}`));
      const verdict = shmin < found.lowest ? "Shmin is below what" : shmax > pp + q * (shmin - pp) ? "SHmax is above what" : "Within what";
      assert.ok(words.includes(verdict), `${words} says "${verdict}"`);
    }
    await close();
  }
});

test("the page opens with the crosshair in the target zone; without a crosshair the polygon asks for one", async () => {
  const { page, close } = await open("quillback-4");
  assert.equal((await page.evaluate(() => window.depthStress.reading())).zone, "bracken sand");
  await page.focus("#stage");
  await page.keyboard.press("Escape");
  await geometry(page);
  assert.match(await page.locator("#polygon-words").textContent(), /^Put the crosshair/);
  assert.equal(await page.locator("#polygon > *").count(), 0);
  await close();
});

test("a well without stress has no polygon and says so", async () => {
  const { page, close } = await open("tiny");
  assert.match(await page.locator("#polygon-words").textContent(), /^(Friction 0\.60.*No horizontal stress here|No polygon)/);
  assert.match(await page.locator("#solver-part").textContent(), /none was solved/);
  await close();
});

test("the spread of choices has the extremes of spread.csv, the solver's part the numbers of run.json", async () => {
  const { page, close } = await open("quillback-4");
  const [head, ...shown] = (await page.evaluate(() => window.depthStress.csv("spread")))
    .trimEnd()
    .split("\n")
    .map((l) => l.split(","));
  const trials = table(wells.folder, "quillback-4", "spread.csv");
  assert.equal(shown.length, 6);
  for (const cells of shown) {
    const values = trials.filter((t) => t.zone === cells[0]).map((t) => Number(t.shmin_mpa));
    const cell = (id) => Number(cells[head.indexOf(id)]);
    assert.ok(Math.abs(cell("every_choice_lowest_mpa") - Math.min(...values)) <= 0.0051, "two decimals beside four");
    assert.ok(Math.abs(cell("every_choice_highest_mpa") - Math.max(...values)) <= 0.0051);
  }
  const { closed_loop: loop } = JSON.parse(readFileSync(join(wells.folder, "quillback-4-results", "run.json"), "utf8"));
  const text = await page.locator("#solver-part").textContent();
  assert.ok(
    text.includes(`in layer ${loop.profile_layer}: ${loop.profile_stress} by ${(100 * loop.profile_share).toFixed(2)} %`),
    text.slice(0, 600),
  );
  assert.ok(loop.formula_share < 1e-6 && loop.profile_share < 0.005);
  await close();
});

test("without scripts the page shows pictures and tables", async () => {
  const { page, close } = await open("quillback-4", { javaScriptEnabled: false });
  assert.equal(await page.locator("#viewer").isVisible(), false);
  assert.equal(await page.locator("#pictures img").first().isVisible(), true);
  assert.ok((await page.locator("#pictures img").first().boundingBox()).height > 200);
  assert.equal(await page.locator("#layers").isVisible(), true);
  await close();
});

test("print gives a paper log: each picture on a page of its own, tables after them", async () => {
  const { page, close } = await open("quillback-4");
  const pages = pagesOf(await page.pdf({ preferCSSPageSize: true }));
  assert.ok(pages.length >= 9 && pages.length <= 18, `${pages.length} pages: one of summary, one a picture, the rest tables, sources and findings`);
  assert.match(pages[0], /Target bracken sand, mean Shmin[^]*How sure:[^]*Caution\./);
  // A table that goes on over pages carries its headings with it.
  const spread = [
    ["missed by more", "Verdict"],
    ["wireline tester", "Verdict"],
    ["read in the source", "Coefficients"],
  ].map(([row, head]) => {
    const withRows = pages.filter((p) => p.includes(row));
    assert.ok(withRows.length >= 1 && withRows.every((p) => p.includes(head)), `pages with "${row}" have "${head}"`);
    return withRows.length;
  });
  assert.ok(Math.max(...spread) >= 2, "at least one table goes on over two pages, so headings are put to the test");
  await page.emulateMedia({ media: "print" });
  assert.equal(await page.locator("#viewer").isVisible(), false);
  assert.equal(await page.locator("#pictures img").count(), 4);
  await close();
});

for (const [width, scheme] of [
  [1280, "light"],
  [1280, "dark"],
  [2560, "light"],
  [320, "light"],
]) {
  test(`axe-core finds no serious fault at ${width} px, ${scheme}; the page is not wider than the window`, async () => {
    const { page, close } = await open("quillback-4", { width, colorScheme: scheme });
    assert.ok(await page.evaluate(() => document.documentElement.scrollWidth <= window.innerWidth), "400 % zoom of 1280 px is 320 px");
    // The policy of the page forbids foreign scripts, so axe comes in through the browser's own door.
    await page.evaluate(axe);
    const { violations } = await page.evaluate(() => window.axe.run(document));
    assert.deepEqual(
      violations.filter((v) => ["serious", "critical"].includes(v.impact)).map((v) => `${v.id}: ${v.nodes.map((n) => n.target).join(" ")}`),
      [],
    );
    await close();
  });
}
