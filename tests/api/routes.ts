import { readdirSync } from "node:fs";
import { fileURLToPath, pathToFileURL } from "node:url";

const folder = fileURLToPath(new URL("../../app/api/", import.meta.url));
const METHODS = ["GET", "POST", "PUT", "PATCH", "DELETE"] as const;
export type Method = (typeof METHODS)[number];

export type Handler = (request: Request, context: { params: Promise<Record<string, string>> }) => Promise<Response> | Response;

export interface ServedRoute {
  /** "PATCH /api/projects/[projectId]" */
  name: string;
  method: Method;
  handler: Handler;
}

/** Every method of every route file, as the folders say it. */
export async function findRoutes(): Promise<ServedRoute[]> {
  const files = readdirSync(folder, { recursive: true, encoding: "utf8" }).filter((file) => /(^|\/)route\.ts$/.test(file)).sort();
  const found = await Promise.all(files.map(async (file) => {
    const served = (await import(/* @vite-ignore */ pathToFileURL(folder + file).href)) as Partial<Record<Method, Handler>>;
    const address = `/api/${file.replace(/\/?route\.ts$/, "")}`;
    return METHODS.flatMap((method) => {
      const handler = served[method];
      return handler ? [{ name: `${method} ${address}`, method, handler }] : [];
    });
  }));
  return found.flat();
}

export async function findRoute(name: string): Promise<Handler> {
  const route = (await findRoutes()).find((one) => one.name === name);
  if (!route) throw new Error(`There is no route ${name}.`);
  return route.handler;
}
