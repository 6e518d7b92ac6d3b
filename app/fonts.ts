import localFont from "next/font/local";

export const overpass = localFont({
  src: [
    { path: "../fonts/overpass-latin-400-normal.woff2", weight: "400", style: "normal" },
    { path: "../fonts/overpass-latin-600-normal.woff2", weight: "600", style: "normal" },
    { path: "../fonts/overpass-latin-800-normal.woff2", weight: "800", style: "normal" },
  ],
  variable: "--font-overpass",
  display: "swap",
  fallback: ["system-ui", "sans-serif"],
});

export const overpassMono = localFont({
  src: [
    { path: "../fonts/overpass-mono-latin-400-normal.woff2", weight: "400", style: "normal" },
    { path: "../fonts/overpass-mono-latin-600-normal.woff2", weight: "600", style: "normal" },
  ],
  variable: "--font-overpass-mono",
  display: "swap",
  fallback: ["ui-monospace", "monospace"],
});

/** For the class of <html>: both families as CSS variables. */
export const fontVariables = `${overpass.variable} ${overpassMono.variable}`;
