"use client";

import type { ConstructionSheet, SheetLayer } from "../../lib/noise/sheet";
import { formatNumber, formatQuantity } from "../format";
import { Cell, HeadCell, Row, RowHead, Table } from "../ui/Table";
import { VisuallyHidden } from "../ui/VisuallyHidden";
import { toMillimetres } from "./units";

interface Props {
  sheet: ConstructionSheet;
  /** "Whole wall", "Whole door", and what its weight counts: "boards alone". */
  whole: string;
  counted: string;
  /** Number of the lit layer, and what lights another. */
  lit?: number;
  onLight?: (number: number | undefined) => void;
}

const DASH = "–";

/** The layers in the order of the section; pointing at a row lights its layer in the drawing. */
export function LayerTable({ sheet, whole, counted, lit, onLight }: Props) {
  return (
    <Table>
      <thead>
        <tr>
          <HeadCell className="w-10 pl-1.5!">
            <VisuallyHidden>Number</VisuallyHidden>
          </HeadCell>
          <HeadCell>Layer</HeadCell>
          <HeadCell figures>mm</HeadCell>
          <HeadCell figures>kg/m²</HeadCell>
          <HeadCell className="hidden mid:table-cell">Where from</HeadCell>
        </tr>
      </thead>
      <tbody onPointerLeave={() => onLight?.(undefined)}>
        {sheet.layers.map((layer, index) => (
          <LayerRow key={index} layer={layer} number={index + 1} lit={lit === index + 1} onLight={onLight} />
        ))}
        <tr className="border-t-2 border-ink font-semibold">
          <Cell />
          <RowHead>{whole}</RowHead>
          <Cell figures>{inMillimetres(sheet.thickness)}</Cell>
          <Cell figures>{sheet.surfaceMass === null ? DASH : formatNumber(sheet.surfaceMass, 1)}</Cell>
          <Cell className="hidden text-second font-normal mid:table-cell">{counted}</Cell>
        </tr>
      </tbody>
    </Table>
  );
}

interface RowProps {
  layer: SheetLayer;
  number: number;
  lit: boolean;
  onLight?: (number: number | undefined) => void;
}

function LayerRow({ layer, number, lit, onLight }: RowProps) {
  return (
    <Row lit={lit} onPointerEnter={() => onLight?.(number)}>
      <Cell className="pl-1.5!">
        <LayerNumber number={number} lit={lit} />
      </Cell>
      <RowHead>{layer.name}</RowHead>
      <Cell figures>{inMillimetres(layer.thickness)}</Cell>
      <Cell figures>{layer.surfaceMass === null ? DASH : formatNumber(layer.surfaceMass, 1)}</Cell>
      <Cell className="hidden text-second text-ink2 mid:table-cell">{layer.whereFrom || DASH}</Cell>
    </Row>
  );
}

function LayerNumber({ number, lit }: { number: number; lit: boolean }) {
  return (
    <svg width="26" height="26" viewBox="0 0 26 26" aria-hidden="true" className="-my-1 block">
      <circle
        cx="13"
        cy="13"
        r="11"
        strokeWidth="1.5"
        className={lit ? "fill-lamp stroke-onlamp" : "fill-sheet stroke-ink"}
      />
      <text
        x="13"
        y="17.5"
        textAnchor="middle"
        fontSize="13"
        fontWeight="650"
        className={lit ? "fill-onlamp!" : undefined}
      >
        {number}
      </text>
    </svg>
  );
}

const inMillimetres = (metres: number | null) =>
  metres === null ? DASH : formatQuantity(toMillimetres(metres), 1);
