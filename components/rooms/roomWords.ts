import { OCTAVE_BANDS } from "../../lib/noise/bands";
import type { Space } from "@/lib/noise/plan";
import { bandWords, formatQuantity, withUnit } from "../format";
import type { FieldWords } from "../plan/SaveNotices";

const labels: Record<string, string> = {
  name: "Name",
  volume: "Volume",
  box: "Size and place",
  absorption: "Absorption",
  buildingId: "Building",
  area: "Area",
  alpha: "Coefficients",
  libraryKey: "Finish",
  finishKey: "Finish",
};

/** How the fields of rooms and surfaces are called and written where two people changed one thing. */
export const roomWords: FieldWords = (_part, field, value) => ({ label: labels[field] ?? field, value: valueWords(field, value) });

function valueWords(field: string, value: unknown): string {
  if (value === null || value === undefined) return "none";
  if (field === "volume") return withUnit(formatQuantity(Number(value)), "m³");
  if (field === "area" && typeof value === "number") return withUnit(formatQuantity(value), "m²");
  if (field === "box") return boxWords(value as NonNullable<Space["box"]>); // the field's own shape
  if (field === "absorption") return absorptionWords(value as Space["absorption"]);
  if (Array.isArray(value)) return value.map((figure) => (figure === null ? "?" : String(figure))).join(" ");
  return String(value);
}

const boxWords = ({ at, size }: NonNullable<Space["box"]>) =>
  `${withUnit(size.map((side) => formatQuantity(side)).join(" by "), "m")} at ${at.map((one) => formatQuantity(one)).join(", ")}`;

function absorptionWords(absorption: Space["absorption"]): string {
  if (absorption.kind === "surfaces") return "from the surfaces";
  const [figures, unit] = absorption.kind === "decay" ? [absorption.seconds, "s"] : [absorption.area, "m²"];
  const at = (band: number) => `${withUnit(figures[band] == null ? "?" : formatQuantity(figures[band]), unit)} at ${bandWords(OCTAVE_BANDS[band]!)}`;
  return `own figures, ${at(1)}, ${at(4)}`;
}
