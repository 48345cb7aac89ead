import "@fontsource-variable/atkinson-hyperlegible-next/wght.css";
import "@fontsource-variable/besley/wght.css";
import "./globals.css";
import type { Metadata, Viewport } from "next";
import { cookies, headers } from "next/headers";
import { connection } from "next/server";
import type { ReactNode } from "react";
import { readTheme, THEME_COOKIE } from "@/components/frame/theme";
import { WidthClassProvider } from "@/components/ui/useWidthClass";
import { readWidthClass, WIDTH_COOKIE } from "@/components/ui/widthClass";

export const metadata: Metadata = {
  title: { default: "Stillyard", template: "%s · Stillyard" },
  description: "Weighs the noise of a backyard music studio against what each listener may hear, octave band by octave band.",
};

export const viewport: Viewport = {
  themeColor: [
    { media: "(prefers-color-scheme: light)", color: "#F9FBF9" },
    { media: "(prefers-color-scheme: dark)", color: "#111F23" },
  ],
};

export default async function RootLayout({ children }: { children: ReactNode }) {
  // A page made ahead of its request would carry no nonce, and its scripts would be blocked.
  await connection();
  const jar = await cookies();
  return (
    <html lang="en" data-theme={readTheme(jar.get(THEME_COOKIE)?.value)}>
      <body>
        <WidthClassProvider initial={readWidthClass(jar.get(WIDTH_COOKIE)?.value, (await headers()).get("user-agent") ?? undefined)}>{children}</WidthClassProvider>
      </body>
    </html>
  );
}
