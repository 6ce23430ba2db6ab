import type { NextConfig } from "next";

const config: NextConfig = {
  distDir: process.env.NEXT_DIST_DIR ?? ".next",
  typedRoutes: true,
  poweredByHeader: false,
  reactStrictMode: true,
};

export default config;
