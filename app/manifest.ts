import type { MetadataRoute } from "next";

export default function manifest(): MetadataRoute.Manifest {
  return {
    name: "Neaptide",
    short_name: "Neaptide",
    description: "A bedside worksheet for ventilator settings and lung protection.",
    start_url: "/beds",
    display: "standalone",
    background_color: "#F6F4EE",
    theme_color: "#F6F4EE",
    icons: [{ src: "/icon.svg", sizes: "any", type: "image/svg+xml" }],
  };
}
