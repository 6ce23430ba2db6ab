"use client";

import { useState } from "react";
import { useUnitPreferences } from "@/components/shell/unit-preferences";
import { IconButton } from "@/components/ui/icon-button";
import { Moment } from "@/components/ui/moment";
import type { SavedDesign } from "@/lib/designs/contract";
import { formatQuantity, NO_FIGURE } from "@/lib/units/format";
import type { QuantityKind } from "@/lib/units/preferences";
import { SectionThumbnail } from "@/components/drawing/section-thumbnail";
import { DesignName } from "./design-name";
import type { DesignActions } from "./use-design-actions";

interface DesignRowProps {
  design: SavedDesign;
  canEdit: boolean;
  actions: DesignActions;
}

/** A saved design on one line: its section, its name, the figures that decide, and what to do with it. */
export function DesignRow({ design, canEdit, actions }: DesignRowProps) {
  const [editing, setEditing] = useState(false);
  const { id, name } = design;
  return (
    <tr role="row" data-design={id}>
      <th role="rowheader" scope="row" className="design-name">
        <SectionThumbnail design={design.document} />
        <DesignName
          id={id}
          name={name}
          editing={editing}
          onDone={(next) => {
            setEditing(false);
            if (next) void actions.rename(design, next);
          }}
        />
      </th>
      <Figure label="Tuning" value={design.tuning_hz} kind="frequency" />
      <Figure label="Air speed" value={design.air_speed_m_s} kind="speed" />
      <Figure label="Rings" value={design.ring_count} kind="count" />
      <Figure label="Net volume" value={design.net_volume_m3} kind="volume" />
      <td role="cell" className="design-when">
        <Moment iso={design.updated_at} />
        {design.updated_by && <span className="block truncate">{design.updated_by}</span>}
      </td>
      {canEdit && (
        <td role="cell" className="design-actions">
          <IconButton icon="edit" label={`Rename ${name}`} onClick={() => setEditing(true)} />
          <IconButton
            icon="copy"
            label={`Duplicate ${name}`}
            onClick={() => void actions.duplicate(design)}
          />
          <IconButton
            icon="bin"
            label={`Delete ${name}`}
            onClick={() => void actions.remove(design)}
          />
        </td>
      )}
    </tr>
  );
}

interface FigureProps {
  label: string;
  value: number | null;
  kind: QuantityKind;
}

/** A figure; its unit stands in the header, and beside it where the header is folded away. */
function Figure({ label, value, kind }: FigureProps) {
  const [preferences] = useUnitPreferences();
  /** One number of places down the column, so that the points stand under each other. */
  const digits =
    kind === "count" ? 0 : kind === "volume" && preferences.system !== "metric" ? 2 : 1;
  const shown = value === null ? null : formatQuantity(value, kind, preferences, { digits });
  return (
    <td role="cell" className="design-figure" data-label={label}>
      {shown ? shown.value : <span aria-label="not known">{NO_FIGURE}</span>}
      {shown?.unit && <span className="design-unit"> {shown.unit}</span>}
    </td>
  );
}
