"use client";

import { useEffect, useRef, useState } from "react";
import type { Design } from "@/lib/document/schema";
import type { BoreField } from "./field";
import type { FieldReply, FieldRequest } from "./worker";

export interface BoreFieldReading {
  /** The last field that was computed; it stays while a newer one is on its way. */
  field: BoreField | null;
  /** Why there is none, in words. */
  message: string | null;
  /** Whether a newer field is being computed. */
  busy: boolean;
}

const NO_WORKER =
  "The bore map needs a browser that runs background work; everything else works without it.";

/**
 * The bore field of a vent, computed in a worker and never on the page's own thread. Only the newest
 * design counts: while one is being computed a newer one waits, and takes the place of any other
 * that waits.
 */
export function useBoreField(design: Design, ventIndex: number): BoreFieldReading {
  const [reading, setReading] = useState<BoreFieldReading>({
    field: null,
    message: null,
    busy: true,
  });
  const queue = useRef<FieldQueue | null>(null);
  useEffect(() => {
    const made = openQueue(setReading);
    queue.current = made;
    return () => {
      made?.close();
      queue.current = null;
    };
  }, []);
  useEffect(() => {
    queue.current?.ask(design, ventIndex);
  }, [design, ventIndex]);
  return reading;
}

interface FieldQueue {
  ask(design: Design, ventIndex: number): void;
  close(): void;
}

function openQueue(show: (reading: BoreFieldReading) => void): FieldQueue | null {
  const fail = () => show({ field: null, message: NO_WORKER, busy: false });
  if (typeof Worker === "undefined") {
    fail();
    return null;
  }
  let worker: Worker;
  try {
    worker = new Worker(new URL("./worker.ts", import.meta.url), { type: "module" });
  } catch {
    fail();
    return null;
  }
  let id = 0;
  let running = false;
  let waiting: FieldRequest | null = null;
  let last: BoreField | null = null;
  const send = (request: FieldRequest) => {
    running = true;
    worker.postMessage(request);
  };
  worker.onmessage = ({ data }: MessageEvent<FieldReply>) => {
    running = false;
    if (data.id === id) {
      last = data.field;
      show({ field: data.field, message: data.message, busy: false });
    }
    const next = waiting;
    waiting = null;
    if (next) send(next);
  };
  worker.onerror = (event) => {
    event.preventDefault();
    running = false;
    waiting = null;
    fail();
  };
  return {
    ask(design, ventIndex) {
      id++;
      show({ field: last, message: null, busy: true });
      const request: FieldRequest = { id, design, ventIndex, options: {} };
      if (running) waiting = request;
      else send(request);
    },
    close: () => worker.terminate(),
  };
}
