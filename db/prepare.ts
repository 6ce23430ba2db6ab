/** Brings the database to this build's migration and, with --seed, puts the demo shop in. */
import { migrate } from "drizzle-orm/node-postgres/migrator";
import { closeDatabase, database } from "./client";
import { seedDemoShop } from "./seed";

const started = performance.now();
await migrate(database(), { migrationsFolder: "db/migrations" });
const seeded = process.argv.includes("--seed") && (await seedDemoShop());
await closeDatabase();
const took = Math.round(performance.now() - started);
console.log(`database ready${seeded ? ", demo shop put in" : ""} (${took} ms)`);
