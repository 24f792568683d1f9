import type { Metadata, Viewport } from "next";
import type { ReactNode } from "react";
import "./fonts";
import "./globals.css";

export const metadata: Metadata = {
  title: { default: "Ringwright", template: "%s · Ringwright" },
  description: "Black-hole pictures you can sign.",
  robots: { index: false, follow: false },
};

export const viewport: Viewport = { width: "device-width", initialScale: 1 };

// Every answer carries its own script nonce, so no page may be made ahead of its request.
export const dynamic = "force-dynamic";

export default function RootLayout({ children }: { children: ReactNode }) {
  return (
    <html lang="en">
      <body>{children}</body>
    </html>
  );
}
