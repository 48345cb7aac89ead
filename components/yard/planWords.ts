import type { FieldWords } from "../plan/SaveNotices";
import { formatQuantity } from "../format";

const labels: Record<string, string> = {
  street: "Street", outline: "Outline", ground: "Ground", temperature: "Air outdoors", humidity: "Humidity outdoors",
  indoorTemperature: "Air indoors", indoorHumidity: "Humidity indoors", trees: "Trees", name: "Name", role: "What it is",
  footprint: "Outline", floors: "Floors", eaves: "Eaves", ridge: "Ridge", ridgeAxis: "The ridge runs", p1: "From", p2: "To",
  height: "Height", thickness: "Thickness", says: "In the sentence", kind: "Kind", spaceId: "Room", position: "Place",
  facade: "In front of a house wall", side: "Side of the fence", box: "Room", normal: "Faces", size: "Size", area: "Area",
  pathId: "Stands in", limit: "Field limit", directivity: "Directivity", diffuseness: "Diffuseness", params: "Figures",
  constructionId: "Construction", construction: "Construction", fromSpaceId: "From", toSpaceId: "To",
};

function valueWords(value: unknown): string {
  if (value === null || value === undefined || value === "") return "none";
  if (typeof value === "number") return formatQuantity(value);
  if (typeof value === "boolean") return value ? "yes" : "no";
  if (typeof value === "string") return value;
  if (!Array.isArray(value)) return "changed";
  return value.every((one) => typeof one === "number") ? value.map((one) => formatQuantity(one)).join(", ") : `${value.length} of them`;
}

/** Fields of what stands in a yard, as the panel that sets two values side by side calls them. */
export const planWords: FieldWords = (_, field, value) => ({ label: labels[field] ?? "This", value: valueWords(value) });
