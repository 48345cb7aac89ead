export {
  connectionSchema,
  descriptionSchema,
  leafSchema,
  type Connection,
  type Description,
  type LeafDescription,
} from "./description";
export type { TransmissionFacts } from "./modelOf";
export { transmissionCached } from "./transmissionCached";
export { transmissionOf, type Transmission } from "./transmissionOf";
