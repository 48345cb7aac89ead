/** Journeys and proofs speak to a served product, which `npm test` and `npm run proof` start. */
export default async function findProduct() {
  if (process.env.DATABASE_ADMIN_URL && process.env.STILLYARD_BUILD_FOLDER) return; // each file starts its own
  const address = process.env.STILLYARD_URL;
  if (!address) throw new Error("Set STILLYARD_URL to a served product, or run npm test.");
  const answer = await fetch(address, { redirect: "manual" });
  if (answer.status >= 500) throw new Error(`The product at ${address} answers ${answer.status}.`);
}
