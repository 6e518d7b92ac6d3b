import type { MetadataRoute } from "next";

/** What a phone needs to keep Hookfast on its home screen; it opens on the field wing. */
export default function manifest(): MetadataRoute.Manifest {
  return {
    id: "/field",
    name: "Hookfast",
    short_name: "Hookfast",
    description: "Walk-arounds for flat-towing rigs, made with no signal.",
    lang: "en-US",
    start_url: "/field",
    scope: "/",
    display: "standalone",
    background_color: "#faf8f2",
    theme_color: "#faf8f2",
    icons: [
      { src: "/icon-192.png", sizes: "192x192", type: "image/png", purpose: "any" },
      { src: "/icon-512.png", sizes: "512x512", type: "image/png", purpose: "any" },
      { src: "/icon-512.png", sizes: "512x512", type: "image/png", purpose: "maskable" },
    ],
  };
}
