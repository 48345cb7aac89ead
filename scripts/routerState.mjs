const header = "next-router-state-tree";

/**
 * Tells whether a request says readably where its page stands. The framework answers what its own parser cannot read
 * with a fault; here the same parser is asked first, so that such a request is refused instead.
 */
export async function routerStateReader() {
  const { default: parser } = await import("next/dist/server/app-render/parse-and-validate-flight-router-state.js");
  return (headers) => {
    try {
      parser.parseAndValidateFlightRouterState(headers[header]);
      return true;
    } catch {
      return false;
    }
  };
}
