"use client";

import dynamic from "next/dynamic";
import { useEffect, useState, type ReactNode } from "react";
import { BenchHeader } from "./bench-header";
import { CurvesRegion } from "./curves-region";
import { DrawingRegion } from "./drawing-region";
import { KeyFigures } from "./key-figures";
import { MarginsList } from "./margins-list";
import { NumbersColumn } from "./numbers/numbers-column";
import { useUndoKeys } from "./use-undo-keys";
import { WhenNear } from "./when-near";

// What plans and cuts comes once the drawing answers.
const RingStack = dynamic(() => import("./ring-stack").then((part) => part.RingStack), {
  ssr: false,
  loading: () => <div className="ring-stack-place" aria-hidden="true" />,
});
const BoreMapPanel = dynamic(() => import("./bore-map-panel").then((part) => part.BoreMapPanel), {
  ssr: false,
});
const JigPanel = dynamic(() => import("./jig-panel").then((part) => part.JigPanel), { ssr: false });

interface BenchProps {
  canEdit: boolean;
  state: ReactNode;
  actions: ReactNode;
  /** For the title block. */
  revision: string;
  drawn: string;
}

/**
 * One design, worked: numbers, section drawing over curves, margins. The drawing answers first;
 * what is heavier is fetched once it does.
 */
export function Bench({ canEdit, state, actions, revision, drawn }: BenchProps) {
  useUndoKeys();
  const ready = useDrawingReady();
  return (
    <div className="bench" data-ready={ready} data-can-edit={canEdit}>
      <BenchHeader canEdit={canEdit} state={state} actions={actions} />
      <KeyFigures />
      <div className="bench-regions">
        <fieldset className="bench-numbers" disabled={!canEdit}>
          <legend className="sr-only">Numbers of the design</legend>
          <NumbersColumn />
        </fieldset>
        <div className="bench-middle">
          <DrawingRegion canEdit={canEdit} revision={revision} drawn={drawn} />
          <CurvesRegion ready={ready} />
        </div>
        <div className="bench-margins">
          <MarginsList />
          {ready && (
            <>
              <RingStack />
              <WhenNear name="bore-map">
                <BoreMapPanel />
              </WhenNear>
              <WhenNear name="jig">
                <JigPanel />
              </WhenNear>
            </>
          )}
        </div>
      </div>
    </div>
  );
}

/** True once the drawing has been painted and listens; the mark is what the bench measures. */
function useDrawingReady(): boolean {
  const [ready, setReady] = useState(false);
  useEffect(() => {
    const frame = requestAnimationFrame(() => {
      performance.mark("ventwright:bench-ready");
      setReady(true);
    });
    return () => cancelAnimationFrame(frame);
  }, []);
  return ready;
}
