import type { Metadata, Viewport } from "next";
import type { ReactNode } from "react";
import { frontWords } from "@/lib/domain/messages/session";
import { fontVariables } from "./fonts";
import "./globals.css";

export const metadata: Metadata = {
  title: { default: frontWords.title, template: `%s · ${frontWords.title}` },
  description: frontWords.lead,
  applicationName: frontWords.title,
  // A digest or a serial number is not a telephone number.
  formatDetection: { telephone: false, email: false, address: false },
};

export const viewport: Viewport = {
  width: "device-width",
  initialScale: 1,
  viewportFit: "cover",
  themeColor: [
    { media: "(prefers-color-scheme: light)", color: "#faf8f2" },
    { media: "(prefers-color-scheme: dark)", color: "#101214" },
  ],
};

/** The document around every page. */
export default function RootLayout({ children }: { children: ReactNode }) {
  return (
    <html lang="en-US" className={fontVariables}>
      <body className="font-sans">{children}</body>
    </html>
  );
}
