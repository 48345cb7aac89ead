/** Charts are drawn for one of four widths, never scaled. */
export const WIDTH_CLASSES = [390, 720, 1024, 1440] as const;
export type WidthClass = (typeof WIDTH_CLASSES)[number];

export const WIDTH_COOKIE = "stillyard-width";

/** The least viewport, in CSS pixels, that each class is drawn for; the same steps as the screens of the theme. */
export const widthSteps: Record<WidthClass, number> = { 390: 0, 720: 640, 1024: 960, 1440: 1280 };

export function widthClassOf(viewport: number): WidthClass {
  return WIDTH_CLASSES.findLast((widthClass) => viewport >= widthSteps[widthClass]) ?? 390;
}

/** Anything but one of ours is a first visit: drawn for a phone where the browser says that it runs on one. */
export function readWidthClass(cookie: string | undefined, userAgent = ""): WidthClass {
  return WIDTH_CLASSES.find((widthClass) => `${widthClass}` === cookie) ?? (/\bMobi/.test(userAgent) ? 390 : 1440);
}
