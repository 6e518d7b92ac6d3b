import type { Config } from "tailwindcss";

/** Only the product's own colors exist as classes, so that a color without a meaning cannot slip in. */
const config: Config = {
  content: ["./app/**/*.{ts,tsx}", "./components/**/*.{ts,tsx}"],
  theme: {
    colors: {
      transparent: "transparent",
      current: "currentColor",
      paper: "var(--paper)",
      shade: "var(--shade)",
      ink: "var(--ink)",
      soft: "var(--soft)",
      edge: "var(--edge)",
      rule: "var(--rule)",
      asphalt: "var(--asphalt)",
      now: "var(--now)",
      lit: "var(--lit)",
      hold: "var(--hold)",
      white: "var(--white)",
      notch: "var(--notch)",
    },
    extend: {
      fontFamily: {
        sans: ["var(--font-overpass)", "system-ui", "sans-serif"],
        mono: ["var(--font-overpass-mono)", "ui-monospace", "monospace"],
      },
      borderWidth: { hair: "1.5px" },
      minHeight: { field: "4.5rem", primary: "6.25rem", desk: "2.75rem" },
    },
  },
};
export default config;
