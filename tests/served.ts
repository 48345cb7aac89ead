/** Journeys and proofs speak to a served product; `npm test` and `npm run proof` start one. */
export default async function findProduct() {
  const address = process.env.STILLYARD_URL;
  if (!address) throw new Error("Set STILLYARD_URL to a served product, or run npm test.");
  const answer = await fetch(address, { redirect: "manual" });
  if (answer.status >= 500) throw new Error(`The product at ${address} answers ${answer.status}.`);
}
