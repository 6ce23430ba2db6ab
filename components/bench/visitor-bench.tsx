"use client";

import { useRouter } from "next/navigation";
import { useEffect, useState } from "react";
import Link from "next/link";
import { keepInBrowser, readVisitorDraft } from "@/lib/bench/draft";
import { createDesign } from "@/lib/designs/requests";
import type { Design } from "@/lib/document/schema";
import { showToast } from "@/components/ui/toasts";
import { Bench } from "./bench";
import { BenchProvider, useBench, useBenchStore } from "./bench-context";
import { StartButton } from "./start-button";

interface VisitorBenchProps {
  sample: Design;
  /** The shop a signed-in person would save to; null for a visitor. */
  shop: string | null;
  canSave: boolean;
  drawn: string;
}

/** The Bench without a saved design: a sample, or what this browser kept. */
export function VisitorBench(props: VisitorBenchProps) {
  return (
    <BenchProvider design={props.sample}>
      <Inside {...props} />
    </BenchProvider>
  );
}

function Inside({ shop, canSave, drawn }: VisitorBenchProps) {
  const kept = useBrowserDraft();
  return (
    <Bench
      canEdit
      state={
        kept
          ? "Kept in this browser"
          : "A sample design of our own: change anything, it is kept in this browser"
      }
      actions={
        <>
          <StartButton />
          {shop === null ? (
            <Link href="/sign-up" className="button-primary">
              Sign up to keep it
            </Link>
          ) : (
            canSave && <SaveButton shop={shop} />
          )}
        </>
      }
      revision="draft"
      drawn={drawn}
    />
  );
}

/** Takes up what the browser kept, and keeps every finished edit. True once there is a draft. */
function useBrowserDraft(): boolean {
  const store = useBenchStore();
  const touched = useBench(({ past, future }) => past.length + future.length > 0);
  const [found, setFound] = useState(false);
  useEffect(() => {
    const draft = readVisitorDraft();
    if (draft) {
      store.getState().load(draft.design);
      queueMicrotask(() => setFound(true));
    }
    return store.subscribe((state, old) => {
      if (!state.dragOrigin && (state.past !== old.past || state.future !== old.future))
        keepInBrowser(state.design, new Date().toISOString());
    });
  }, [store]);
  return found || touched;
}

function SaveButton({ shop }: { shop: string }) {
  const store = useBenchStore();
  const router = useRouter();
  const [saving, setSaving] = useState(false);
  const save = async () => {
    setSaving(true);
    try {
      const saved = await createDesign(store.getState().design);
      router.push(`/bench/${saved.id}`);
    } catch (error) {
      setSaving(false);
      showToast({ message: error instanceof Error ? error.message : String(error), fault: true });
    }
  };
  return (
    <button type="button" className="button-primary" onClick={save} disabled={saving}>
      {saving ? "Saving …" : `Save to ${shop}`}
    </button>
  );
}
