"use client";

import { useState, type ReactNode } from "react";
import { useUnitPreferences } from "@/components/shell/unit-preferences";
import { Icon } from "@/components/ui/icons";
import { SelectField } from "@/components/ui/select-field";
import type { SavedDesign } from "@/lib/designs/contract";
import type { QuantityKind } from "@/lib/units/preferences";
import { shownUnits } from "@/lib/units/shown-units";
import { DesignRow } from "./design-row";
import { orderNames, sortDesigns, type DesignOrder, type OrderKey } from "./sort-designs";
import { useDesignActions } from "./use-design-actions";

interface DesignTableProps {
  designs: SavedDesign[];
  canEdit: boolean;
  /** Every design of the shop is here: only then does an order mean anything. */
  complete: boolean;
}

/** All saved designs, in any order; on a phone each becomes a small sheet of its own. */
export function DesignTable({ designs, canEdit, complete }: DesignTableProps) {
  const actions = useDesignActions();
  const [{ system }] = useUnitPreferences();
  const [order, setOrder] = useState<DesignOrder>({ key: "updated_at", descending: true });
  const head = (key: OrderKey, kind?: QuantityKind) => {
    const unit = kind ? `, ${shownUnits[kind][system].unit}` : "";
    return (
      <Heading order={order} of={key} sortable={complete} onOrder={setOrder}>
        {orderNames[key] + unit}
      </Heading>
    );
  };
  const orders = Object.entries(orderNames) as [OrderKey, string][];
  return (
    <>
      {complete && designs.length > 1 && (
        <div className="border-b border-rule md:hidden">
          <SelectField
            id="designs.order"
            label="Order by"
            value={order.key}
            options={orders.map(([value, label]) => ({ value, label }))}
            onChange={(key) => setOrder({ key, descending: key === "updated_at" })}
          />
        </div>
      )}
      <table role="table" className="figures-table designs-table">
        <caption className="sr-only">Saved designs</caption>
        <thead role="rowgroup">
          <tr role="row">
            {head("name")}
            {head("tuning_hz", "frequency")}
            {head("air_speed_m_s", "speed")}
            {head("ring_count")}
            {head("net_volume_m3", "volume")}
            {head("updated_at")}
            {canEdit && (
              <th role="columnheader" scope="col">
                <span className="sr-only">Actions</span>
              </th>
            )}
          </tr>
        </thead>
        <tbody role="rowgroup">
          {(complete ? sortDesigns(designs, order) : designs).map((design) => (
            <DesignRow key={design.id} design={design} canEdit={canEdit} actions={actions} />
          ))}
        </tbody>
      </table>
    </>
  );
}

interface HeadingProps {
  order: DesignOrder;
  of: OrderKey;
  sortable: boolean;
  onOrder: (order: DesignOrder) => void;
  children: ReactNode;
}

function Heading({ order, of, sortable, onOrder, children }: HeadingProps) {
  const chosen = sortable && order.key === of;
  const direction = order.descending ? "descending" : "ascending";
  const next = { key: of, descending: chosen ? !order.descending : of === "updated_at" };
  return (
    <th role="columnheader" scope="col" aria-sort={chosen ? direction : undefined}>
      {sortable ? (
        <button type="button" className="sort-button" onClick={() => onOrder(next)}>
          {children}
          <Icon
            name={chosen && !order.descending ? "up" : "down"}
            className={chosen ? "" : "invisible"}
            width={12}
            height={12}
          />
        </button>
      ) : (
        children
      )}
    </th>
  );
}
