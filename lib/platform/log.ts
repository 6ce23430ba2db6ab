import "server-only";
import pino, { type Logger } from "pino";

/** Structured lines on standard output. Nothing a person typed goes in but through these fields. */
export const log: Logger = pino({
  level: process.env.LOG_LEVEL ?? "info",
  base: null,
  timestamp: pino.stdTimeFunctions.isoTime,
});
