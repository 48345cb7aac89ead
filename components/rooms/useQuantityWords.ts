import { formatQuantity, withUnit } from "../format";
import { useFigures, withMark } from "../ui/figures";
import { toShown, unitName, type Quantity } from "../ui/quantities";

/** Writes SI figures in the reader's units: "19.4 m²", "209 ft²". */
export function useQuantityWords() {
  const { units, mark } = useFigures();
  const say = (quantity: Quantity, si: number, decimals = 1): string =>
    withUnit(withMark(formatQuantity(toShown(quantity, units, si), decimals), mark), unitName(quantity, units));
  return Object.assign(say, { units, mark });
}
