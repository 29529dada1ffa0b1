// Size of a report page, and time from opening it to its first drawn tracks: node first-draw.js REPORT.html...
import { statSync } from "node:fs";
import { resolve } from "node:path";
import { pathToFileURL } from "node:url";
import { chromium } from "playwright-core";

const ROUNDS = 7;
const browser = await chromium.launch({ executablePath: process.env.CHROMIUM ?? "/usr/bin/chromium", args: ["--no-sandbox"] });
const times = new Map(process.argv.slice(2).map((file) => [file, []]));
for (let round = 0; round < ROUNDS; round++) {
  for (const [file, found] of times) {
    const page = await browser.newPage({ viewport: { width: 1280, height: 900 } });
    await page.goto(pathToFileURL(resolve(file)).href);
    await page.waitForFunction(() => window.depthStress);
    found.push(await page.evaluate(() => window.depthStress.firstDrawn));
    await page.close();
  }
}
await browser.close();
for (const [file, found] of times) {
  const median = found.sort((a, b) => a - b)[Math.floor(ROUNDS / 2)];
  console.log(`${file}: ${(statSync(file).size / 1e6).toFixed(2)} MB, first tracks after ${Math.round(median)} ms (median of ${ROUNDS})`);
}
