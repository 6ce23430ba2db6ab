import type { Metadata, Viewport } from "next";
import { cookies } from "next/headers";
import type { ReactNode } from "react";
import { archivo, archivoExtended } from "@/components/shell/fonts";
import { PREFERENCES_COOKIE, readSessionPreferences } from "@/lib/units/session-preferences";
import "./globals.css";

export const metadata: Metadata = {
  title: { default: "Ventwright", template: "%s · Ventwright" },
  description:
    "From driver to tuned box: pick the bore, stack the rings, cut them right, prove the tuning.",
  applicationName: "Ventwright",
};

export const viewport: Viewport = {
  width: "device-width",
  initialScale: 1,
  themeColor: [
    { media: "(prefers-color-scheme: light)", color: "#f8fafb" },
    { media: "(prefers-color-scheme: dark)", color: "#10171e" },
  ],
};

export default async function RootLayout({ children }: { children: ReactNode }) {
  const jar = await cookies();
  const preferences = readSessionPreferences(jar.get(PREFERENCES_COOKIE)?.value);
  return (
    <html
      lang="en"
      className={`${archivo.variable} ${archivoExtended.variable}`}
      data-theme={preferences.theme === "system" ? undefined : preferences.theme}
    >
      <body className="flex min-h-dvh flex-col">
        <a
          href="#main"
          className="fixed top-2 left-2 z-50 -translate-y-20 rounded-sm bg-ink px-3 py-2 text-film focus:translate-y-0"
        >
          Skip to the content
        </a>
        {children}
      </body>
    </html>
  );
}
