import type { Metadata, Viewport } from "next";
import { cookies, headers } from "next/headers";
import type { ReactNode } from "react";
import { archivo, archivoExtended } from "@/components/shell/fonts";
import { Footer } from "@/components/shell/footer";
import { Header } from "@/components/shell/header";
import { Providers } from "@/components/shell/providers";
import { currentSession } from "@/lib/accounts/session";
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
  const session = await currentSession();
  const cookie = (await cookies()).get(PREFERENCES_COOKIE)?.value;
  const requestId = (await headers()).get("x-request-id");
  const preferences = session?.person.preferences ?? readSessionPreferences(cookie);
  return (
    <html
      lang="en"
      className={`${archivo.variable} ${archivoExtended.variable}`}
      data-theme={preferences.theme === "system" ? undefined : preferences.theme}
    >
      <head>{requestId && <meta name="request-id" content={requestId} />}</head>
      <body className="flex min-h-dvh flex-col">
        <a href="#main" className="skip-link">
          Skip to the content
        </a>
        <Providers
          key={session?.person.id ?? "visitor"}
          preferences={preferences}
          signedIn={session !== null}
        >
          <Header account={session && { person: session.person.name, shop: session.shop.name }} />
          {children}
          <Footer />
        </Providers>
      </body>
    </html>
  );
}
