import assert from "node:assert/strict";
import { cpSync, mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { dirname, join } from "node:path";
import { after, test } from "node:test";
import { fileURLToPath, pathToFileURL } from "node:url";

// The page's modules as node takes them: beside a package.json that calls them modules.
const folder = mkdtempSync(join(tmpdir(), "depthstress-modules-"));
cpSync(join(dirname(fileURLToPath(import.meta.url)), "..", "..", "src", "DepthStress.Report", "Web", "script"), folder, { recursive: true });
writeFileSync(join(folder, "package.json"), '{ "type": "module" }');
after(() => rmSync(folder, { recursive: true }));
const load = (name) => import(pathToFileURL(join(folder, `${name}.js`)));
const { convert, digitsText, digitsValue, endText, fixedText, roundStep, stepText } = await load("numbers");
const { readStore } = await load("store");
const { View } = await load("view");
const { limitsOf, wordsOf } = await load("polygon");

test("digits become the text they were printed as", () => {
  assert.deepEqual(
    [
      [123456, 4],
      [-5, 3],
      [7, 0],
      [0, 2],
      [NaN, 2],
    ].map(([digits, decimals]) => digitsText(digits, decimals)),
    ["12.3456", "-0.005", "7", "0.00", ""],
  );
  for (let i = 0; i < 2000; i++) {
    const [digits, decimals] = [Math.floor((Math.random() - 0.5) * 2 ** 31), i % 7];
    assert.equal(digitsValue(digits, decimals), Number(digitsText(digits, decimals)));
  }
});

test("units convert by factor and offset, and a missing value stays missing", () => {
  const [foot, metre] = [
    { factor: 0.3048, offset: 0 },
    { factor: 1, offset: 0 },
  ];
  const [celsius, fahrenheit] = [
    { factor: 1, offset: 273.15 },
    { factor: 5 / 9, offset: 459.67 * (5 / 9) },
  ];
  assert.equal(convert(1000, foot, metre), 304.8); // the foot is 0.3048 m exactly
  assert.ok(Math.abs(convert(100, celsius, fahrenheit) - 212) < 1e-10); // water boils at 100 degC, 212 degF
  assert.equal(fixedText(convert(NaN, foot, metre), 2), "");
  assert.equal(fixedText(-0.0004, 2), "0.00");
});

test("steps are 1, 2 or 5 times a power of ten and cut a range into no more parts than asked", () => {
  for (let i = 0; i < 2000; i++) {
    const [range, parts] = [10 ** (Math.random() * 12 - 6), 1 + Math.floor(Math.random() * 20)];
    const step = roundStep(range, parts);
    const lead = step / 10 ** Math.floor(Math.log10(step) + 1e-9);
    assert.ok(
      [1, 2, 5].some((f) => Math.abs(lead - f) < 1e-6),
      `${step}`,
    );
    assert.ok(range / step <= parts * (1 + 1e-6));
  }
  assert.deepEqual([stepText(0.30000000000000004, 0.1), stepText(1200, 200), endText(1.95000001)], ["0.3", "1200", "1.95"]);
});

// Zhang 2019, Applied Petroleum Geomechanics, p. 168, Fig. 5.3: 4316 m, Sv 82.5, Pp 69.7 MPa, friction 0.6.
test("friction limits meet a published case", () => {
  const limits = limitsOf(82.5, 69.7, 0.6);
  assert.ok(Math.abs(limits.lowest - 73.8033) < 1e-3 && Math.abs(limits.highest - 109.6287) < 1e-3);
  assert.deepEqual(limits.corners[1], [limits.lowest, 82.5]);
  assert.ok(Math.abs(limits.highestAt(limits.lowest) - 82.5) < 1e-9, "at the least Shmin normal and strike-slip faulting meet");
  assert.equal(limitsOf(10, 10, 0.6), null);
  assert.equal(limitsOf(NaN, 10, 0.6), null);
  assert.equal(limitsOf(20, 10, 0), null);
});

test("words say where the model stands", () => {
  const at = (shmin, shmax) => wordsOf({ sv: 82.5, pp: 69.7, shmin, shmax, unit: { unit: "MPa", decimals: 4 }, limits: limitsOf(82.5, 69.7, 0.6) });
  assert.match(at(75, 80), /^Friction 0\.60: Shmin from 73\.80 MPa, SHmax to 109\.63 MPa; at this Shmin SHmax to 86\.23 MPa\. Within/);
  assert.match(at(75, 87), /SHmax is above/);
  assert.match(at(73, 80), /Shmin is below/);
  assert.match(at(75, NaN), /SHmax is not known/);
  assert.match(at(NaN, NaN), /No horizontal stress/);
});

const base64 = (numbers) => Buffer.from(Int32Array.from(numbers).buffer).toString("base64");
const unit = (name, factor, decimals) => ({ unit: name, factor, offset: 0, decimals });

/** Six rows, their depths in tenths of a metre; a hole that rises again at its end. */
function small(perRow = 1) {
  const column = (id, digits, high) => ({
    id,
    title: id,
    symbol: id,
    metric: unit("m", 1, 1),
    field: unit("ft", 0.3048, 1),
    wide: false,
    low: base64(digits),
    ...(high && { high: base64(high) }),
  });
  return readStore(
    JSON.stringify({
      units: "metric",
      rows: 6,
      perRow,
      columns: [
        column("md", [1000, 1010, 1020, 1030, 1040, 1050], perRow > 1 ? [1009, 1019, 1029, 1039, 1049, 1059] : null),
        column("tvd", [1000, 1008, 1012, 1014, 1013, 1011]),
        column("gr", [1, -2147483648, 3, 4, 5, 6]),
      ],
      words: [{ id: "zone", title: "zone", list: ["a", "b", ""], runs: [2, 0, 5, 1, 6, 2] }],
      tracks: [{ id: "t", shown: true, curves: [] }],
      zones: [],
      layers: [],
      observations: [],
      friction: [2, 0.6, 6, 0.8],
      origins: {},
    }),
  );
}

test("a store gives digits, missing values, words and friction of a row", () => {
  const store = small();
  assert.equal(store.columns.get("gr").text(1, "metric"), "");
  assert.ok(Number.isNaN(store.columns.get("gr").values("metric").low[1]));
  assert.equal(store.columns.get("md").text(0, "field"), (100 / 0.3048).toFixed(1));
  assert.deepEqual(
    [0, 1, 2, 4, 5].map((row) => store.words.get("zone").at(row)),
    ["a", "a", "b", "b", ""],
  );
  assert.deepEqual(
    [0, 1, 2, 5, 6].map((row) => store.frictionAt(row)),
    [0.6, 0.6, 0.8, 0.8, NaN],
  );
  assert.equal(small(10).columns.get("md").text(0, "metric"), "100.0 to 100.9");
});

test("a view stays inside the log, keeps what it shows when depth kind or units change, and knows a hole that rises", () => {
  const view = new View(small());
  assert.deepEqual([view.top, view.base], [100, 105]);
  view.show(90, 95);
  assert.equal(view.top, 100);
  view.show(104, 120);
  assert.ok(Math.abs(view.base - 105) < 1e-12);
  view.whole();
  view.change("tvd", "metric");
  assert.deepEqual([view.top, view.base], [100, 101.4]);
  assert.equal(view.nearest(101.38), 3);
  view.change("md", "field");
  assert.ok(Math.abs(view.top - 100 / 0.3048) < 1e-9 && Math.abs(view.base - 105 / 0.3048) < 1e-9);
  view.point(99);
  assert.equal(view.row, 5);
  view.point(-4);
  assert.equal(view.row, -1);
});
