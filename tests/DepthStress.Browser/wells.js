import { execFileSync } from "node:child_process";
import { cpSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { dirname, join } from "node:path";
import { fileURLToPath } from "node:url";

const root = join(dirname(fileURLToPath(import.meta.url)), "..", "..");
const program = process.env.DEPTHSTRESS_PROGRAM ?? join(root, ".artifacts", "bin", "DepthStress.Cli", "debug", "depthstress.dll");

/** A folder of its own, with the sample well and smaller wells, all run. */
export function runWells() {
  const folder = mkdtempSync(join(tmpdir(), "depthstress-browser-"));
  cpSync(join(root, "sample-logs"), folder, { recursive: true });
  const sample = join(folder, "quillback-4.toml");
  writeFileSync(join(folder, "field.toml"), `${readFileSync(sample, "utf8")}\n[output]\nunits = "field"\n`);
  writeTiny(folder);
  writeMany(folder);
  for (const well of ["quillback-4", "field", "tiny", "many"])
    execFileSync("dotnet", [program, "run", `${well}.toml`, "--spread"], { cwd: folder, stdio: ["ignore", "ignore", "inherit"] });
  return { folder, page: (well) => `file://${join(folder, `${well}-results`, "report.html")}`, remove: () => rmSync(folder, { recursive: true }) };
}

/** Two samples, one curve beside depth, a mnemonic with markup, neither zones nor observations. */
function writeTiny(folder) {
  writeFileSync(join(folder, "tiny.csv"), "DEPT,<script>alert(1)</script>\nm,g/cm3\n1000.0,2.40\n1000.5,2.41\n");
  writeFileSync(join(folder, "tiny.toml"), well("Tiny <b>well</b>", "tiny.csv", '\ndensity = "<script>alert(1)</script>"\n'));
}

/** So many samples that the page carries bins, with one extreme in a single sample. */
function writeMany(folder) {
  const rows = Array.from(
    { length: 50_000 },
    (_, i) => `${(1000 + i * 0.05).toFixed(2)},${i === 33_333 ? "2.9000" : (2.3 + 0.1 * Math.sin(i / 900)).toFixed(4)}`,
  );
  writeFileSync(join(folder, "many.csv"), `DEPT,RHO\nm,g/cm3\n${rows.join("\n")}\n`);
  writeFileSync(join(folder, "many.toml"), well("Many", "many.csv", '\ndensity = "RHO"\n'));
}

const well = (name, file, curves) => `[well]
name = "${name}"
datum = "rotary table"
datum_elevation = "30 m"
ground_elevation = "25 m"
water_table_depth = "10 m"

[logs]
files = ["${file}"]

[logs.curves]${curves}
[survey]
vertical = true

[moduli]
static_youngs = "lacy-1997-combined"
static_poisson = "equal-to-dynamic"

[biot]
coefficient = 0.8

[overburden]
above_log = "2.0 g/cm3"

[pore_pressure]
method = "hydrostatic"
fluid_density = "1.03 g/cm3"
`;

/** The text of each page of a PDF, columns kept beside each other. */
export function pagesOf(pdf) {
  return execFileSync("pdftotext", ["-layout", "-", "-"], { input: pdf, encoding: "utf8" }).split("\f").slice(0, -1);
}

/** A result table as rows of cells by name. */
export function table(folder, well, name) {
  const [head, ...rows] = readFileSync(join(folder, `${well}-results`, name), "utf8")
    .trimEnd()
    .split("\n")
    .map((line) => line.split(","));
  return rows.map((cells) => Object.fromEntries(head.map((title, k) => [title, cells[k]])));
}
