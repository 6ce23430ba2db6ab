/**
 * Runs the benchmarks: all, or the named ones. With --json, standard output holds one object of
 * figures by name and nothing else.
 */
import { readdirSync } from "node:fs";
import { dirname, join } from "node:path";
import { fileURLToPath, pathToFileURL } from "node:url";

interface Figures {
  name: string;
  median_ms: number;
  ratio_to_c: number | null;
  notes?: string[];
}

const folder = join(dirname(fileURLToPath(import.meta.url)), "cases");
const present = readdirSync(folder)
  .filter((file) => file.endsWith(".ts"))
  .map((file) => file.slice(0, -3))
  .sort();

async function main(args: string[]): Promise<number> {
  const json = args.includes("--json");
  const named = args.filter((argument) => !argument.startsWith("--"));
  const unknown = named.filter((name) => !present.includes(name));
  if (unknown.length > 0) {
    console.error(`There is no benchmark ${unknown.join(", ")}. There are: ${present.join(", ")}.`);
    return 2;
  }
  const answer: Record<string, Pick<Figures, "median_ms" | "ratio_to_c">> = {};
  for (const name of named.length > 0 ? named : present) {
    const path = pathToFileURL(join(folder, `${name}.ts`)).href;
    const loaded = (await import(path)) as { bench: () => Promise<Figures> };
    const { median_ms, ratio_to_c, notes = [] } = await loaded.bench();
    answer[name] = { median_ms, ratio_to_c };
    if (json) continue;
    const ratio = ratio_to_c === null ? "" : `, ${ratio_to_c.toFixed(2)} times plain C`;
    console.log(`${name}: median ${median_ms.toFixed(2)} ms${ratio}`);
    for (const note of notes) console.log(`  ${note}`);
  }
  if (json) console.log(JSON.stringify(answer));
  return 0;
}

main(process.argv.slice(2)).then(
  (code) => process.exit(code),
  (error: unknown) => {
    console.error(error);
    process.exit(1);
  },
);
