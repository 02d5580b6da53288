import type { MetadataRoute } from "next";

export default function manifest(): MetadataRoute.Manifest {
  return {
    id: "/readings",
    name: "Battenbook",
    short_name: "Battenbook",
    description: "Readings of an inclining test, taken without signal",
    start_url: "/readings",
    scope: "/",
    display: "standalone",
    orientation: "any",
    background_color: "#f6f1e4",
    theme_color: "#0e2227",
    icons: [
      { src: "/icon-192.png", sizes: "192x192", type: "image/png" },
      { src: "/icon-512.png", sizes: "512x512", type: "image/png" },
      { src: "/icon-maskable-512.png", sizes: "512x512", type: "image/png", purpose: "maskable" },
    ],
  };
}
