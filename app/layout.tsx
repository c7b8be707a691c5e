import type { Metadata, Viewport } from "next";
import type { ReactNode } from "react";
import { Providers } from "@/components/ui/Providers";
import { barlow, barlowExt, plexMono, plexMonoExt } from "./fonts";
import "./globals.css";

export const metadata: Metadata = {
  title: { default: "Foldwright", template: "%s · Foldwright" },
  description: "From the flanges of a part to good parts off the press brake.",
  robots: { index: false, follow: false },
};

/** Every page is made for its request: its scripts carry the nonce of that request's content security policy. */
export const dynamic = "force-dynamic";

export const viewport: Viewport = { width: "device-width", initialScale: 1, themeColor: "#F7F4EC" };

export default function RootLayout({ children }: { readonly children: ReactNode }) {
  return (
    <html lang="en" className={`${barlow.variable} ${barlowExt.variable} ${plexMono.variable} ${plexMonoExt.variable}`}>
      <body>
        <Providers>{children}</Providers>
      </body>
    </html>
  );
}
