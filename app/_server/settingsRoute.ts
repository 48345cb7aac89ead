import "server-only";
import { z } from "zod";
import { User } from "@/models";
import { answer, emptyAnswer, renewed, requireReader } from "./answer";
import { readBody, requireSameOrigin } from "./request";
import { read } from "./sessionRoutes";

const settings = z.strictObject({
  theme: z.enum(["light", "dark", "system"]).optional(),
  units: z.enum(["metric", "us"]).optional(),
  decimalMark: z.enum(["point", "comma"]).optional(),
});

/** Keeps the reader's own settings. */
export function settingsRoute(request: Request): Promise<Response> {
  return answer(async () => {
    requireSameOrigin(request);
    const reader = await requireReader(request);
    const chosen = read(settings, await readBody(request));
    await User.update(chosen, { where: { id: reader.id }, fields: ["theme", "units", "decimalMark"] });
    return renewed(emptyAnswer(), reader);
  });
}
