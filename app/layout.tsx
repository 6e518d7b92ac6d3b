import type { Metadata, Viewport } from "next";
import type { ReactNode } from "react";
import { FollowPreferences } from "@/components/settings/follow-preferences";
import { FIRST_PAINT } from "@/lib/client/first-paint";
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
    // Its attributes are set before React comes, by the script that dresses the page as chosen.
    <html lang="en-US" className={fontVariables} suppressHydrationWarning>
      <head>
        <script dangerouslySetInnerHTML={{ __html: FIRST_PAINT }} />
      </head>
      <body className="font-sans">
        {children}
        <FollowPreferences />
      </body>
    </html>
  );
}
