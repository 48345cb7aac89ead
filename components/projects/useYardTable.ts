"use client";

import {
  columnFilteringFeature,
  createColumnHelper,
  createFilteredRowModel,
  createSortedRowModel,
  rowSortingFeature,
  tableFeatures,
  useTable,
} from "@tanstack/react-table";
import { useMemo } from "react";
import type { ProjectLine } from "./ProjectLine";
import { isState, type Order, type YardView } from "./yardView";

const features = tableFeatures({
  columnFilteringFeature,
  rowSortingFeature,
  filteredRowModel: createFilteredRowModel(),
  sortedRowModel: createSortedRowModel(),
});

const folded = (text: string): string => text.normalize("NFD").replace(/\p{Diacritic}/gu, "").toLowerCase();
const wordsOf = ({ name, says, people }: ProjectLine): string => folded([name, says, ...people.map((person) => person.name)].join(" "));

/** A margin to put in order; what is not weighed has none, whatever it was before. */
const marginOf = ({ state, margin }: ProjectLine): number | undefined =>
  state !== "not weighed" && typeof margin === "number" ? margin : undefined;

const helper = createColumnHelper<typeof features, ProjectLine>();
const columns = helper.columns([
  helper.accessor((line) => line.name, {
    id: "name",
    sortFn: (one, other) => one.original.name.localeCompare(other.original.name, "en", { numeric: true, sensitivity: "base" }),
  }),
  helper.accessor(marginOf, {
    id: "margin",
    sortUndefined: "last",
    sortFn: (one, other) => marginOf(one.original)! - marginOf(other.original)!,
  }),
  helper.accessor((line) => line.changedAt, { id: "changed", sortFn: (one, other) => Date.parse(one.original.changedAt) - Date.parse(other.original.changedAt) }),
  helper.accessor((line) => line.state, { id: "state", filterFn: (row, _, wanted) => row.original.state === wanted }),
  helper.accessor(wordsOf, {
    id: "words",
    filterFn: (row, _, wanted) => folded(String(wanted)).split(/\s+/).every((word) => wordsOf(row.original).includes(word)),
  }),
]);

/** The latest change first, names from A, the worst margin first. */
const orders: Record<Order, { id: string; desc: boolean }[]> = {
  changed: [{ id: "changed", desc: true }],
  name: [{ id: "name", desc: false }],
  margin: [{ id: "margin", desc: false }],
};

/** The yards that a view shows, in its order. Where the words were looked for on the server they are not asked again. */
export function useYardTable(projects: readonly ProjectLine[], { words, show, order }: YardView, wordsFound: boolean): ProjectLine[] {
  const data = useMemo(() => [...projects], [projects]);
  const state = useMemo(
    () => ({
      sorting: orders[order],
      columnFilters: [
        ...(isState(show) ? [{ id: "state", value: show }] : []),
        ...(!wordsFound && words.trim() ? [{ id: "words", value: words.trim() }] : []),
      ],
    }),
    [order, show, words, wordsFound],
  );
  const table = useTable({ features, columns, data, state, getRowId: (line) => line.id });
  return table.getRowModel().rows.map(({ original }) => original);
}
