/** Computes bore fields off the main thread: one request in, one field (or what hinders it) out. */
import { InputError } from "@/lib/acoustics/input-error";
import type { Design } from "@/lib/document/schema";
import { boreField, type BoreField, type BoreFieldOptions } from "./field";

export interface FieldRequest {
  id: number;
  design: Design;
  ventIndex: number;
  options: BoreFieldOptions;
}

export type FieldReply =
  { id: number; field: BoreField; message: null } | { id: number; field: null; message: string };

/** The part of a worker's scope that is used here; the DOM's types describe a window. */
interface Scope {
  onmessage: ((event: MessageEvent<FieldRequest>) => void) | null;
  postMessage(reply: FieldReply, transfer: Transferable[]): void;
}

const scope = globalThis as unknown as Scope;

scope.onmessage = ({ data: { id, design, ventIndex, options } }) => {
  try {
    const field = boreField(design, ventIndex, options);
    const buffers = Object.values(field)
      .filter((value): value is Float32Array<ArrayBuffer> => ArrayBuffer.isView(value))
      .map((view) => view.buffer);
    scope.postMessage({ id, field, message: null }, buffers);
  } catch (error) {
    if (!(error instanceof InputError)) throw error;
    const message = error.allowed ? `${error.message} (${error.allowed})` : error.message;
    scope.postMessage({ id, field: null, message }, []);
  }
};
