import { landingBuildOf } from "@/components/landing/landingBuildOf";
import { landingAnswers } from "./_server/landingAnswers";

/** The example as drawn, which stands beside the forms before the sign-in. */
export function exampleBuild() {
  const [{ key, plan, verdict }] = landingAnswers();
  return landingBuildOf(key, plan, verdict);
}
