/** Ends the reference run with the worst error of each topic. */
import { existsSync, mkdtempSync, readFileSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import type { Reporter } from "vitest/reporters";

interface Line {
  topic: string;
  name: string;
  relative: number;
  share: number;
}

export default class SummaryReporter implements Reporter {
  private folder = mkdtempSync(join(tmpdir(), "ventwright-reference-"));
  private file = join(this.folder, "record");

  constructor() {
    process.env.VENTWRIGHT_REFERENCE_RECORD = this.file;
  }

  onTestRunEnd(): void {
    if (existsSync(this.file)) {
      const lines = readFileSync(this.file, "utf8")
        .trim()
        .split("\n")
        .map((line): Line => JSON.parse(line));
      console.log(`\nReference checks, worst error by topic\n${table(lines)}`);
    }
    rmSync(this.folder, { recursive: true, force: true });
  }
}

function table(lines: Line[]): string {
  const topics = [...new Set(lines.map(({ topic }) => topic))].sort();
  const rows = topics.map((topic) => {
    const own = lines.filter((line) => line.topic === topic);
    const worst = own.reduce((a, b) => (b.relative > a.relative ? b : a));
    const tightest = own.reduce((a, b) => (b.share > a.share ? b : a));
    return [
      topic,
      String(own.length),
      `${(100 * worst.relative).toPrecision(2)} %`,
      worst.name,
      `${(100 * tightest.share).toFixed(0)} %`,
    ];
  });
  const head = ["topic", "rows", "worst error", "at", "of its tolerance"];
  const widths = head.map((title, column) =>
    Math.max(title.length, ...rows.map((row) => (row[column] ?? "").length)),
  );
  return [head, ...rows]
    .map((row) => row.map((cell, column) => cell.padEnd(widths[column] ?? 0)).join("  "))
    .join("\n");
}
