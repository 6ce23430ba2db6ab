import next from "eslint-config-next/core-web-vitals";
import typescript from "eslint-config-next/typescript";

/** Forbids imports, with the reason. */
const forbid = (files, patterns, ignores = []) => ({
  files,
  ignores,
  rules: {
    "no-restricted-imports": [
      "error",
      { patterns: patterns.map(([group, message]) => ({ group, message })) },
    ],
  },
});

const web = [
  ["react", "react-dom", "next", "next/*", "node:*", "pg", "drizzle-orm*"],
  "This folder is pure: it runs in the browser, in a worker, on the command line and in tests.",
];
const upwards = [
  ["@/app/*", "@/components/*"],
  "Arrows point one way: app → components → lib. Move what is shared down into lib.",
];
const data = [
  ["@/db/*", "@/lib/*/data", "@/lib/*/mutations"],
  "Only data layers touch the database; the client asks a route.",
];

const config = [
  {
    ignores: [
      ".next*/**",
      "node_modules/**",
      "next-env.d.ts",
      "db/migrations/**",
      ".data/**",
      "test-results/**",
      "playwright-report/**",
    ],
  },
  ...next,
  ...typescript,
  forbid(
    ["lib/acoustics/**", "lib/workshop/**", "lib/margins/**", "lib/working/**", "lib/drawing/**"],
    [web, upwards, data],
  ),
  forbid(
    ["lib/**"],
    [upwards],
    ["lib/acoustics/**", "lib/workshop/**", "lib/margins/**", "lib/working/**", "lib/drawing/**"],
  ),
  forbid(["components/**"], [[["@/app/*"], upwards[1]], data]),
  forbid(["app/**"], [[["@/db/*"], data[1]]]),
  {
    files: ["app/**", "components/**", "lib/**"],
    ignores: ["lib/accounts/session.ts"],
    rules: {
      "no-restricted-syntax": [
        "error",
        {
          selector: "ImportSpecifier[imported.name='mintAuthorizedShopId']",
          message: "Only the session gate mints a shop's scope. Take it from requireShop.",
        },
      ],
    },
  },
  { rules: { "no-console": ["error", { allow: ["warn", "error"] }] } },
  {
    files: ["scripts/**", "db/prepare.ts", "bench/**", "tests/**"],
    rules: { "no-console": "off" },
  },
];

export default config;
