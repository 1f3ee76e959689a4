import type { Config } from "tailwindcss";

const token = (name: string) => `var(--${name})`;

/** Colours are the tokens of app/tokens.css, by name; nothing else is a colour here. */
const config: Config = {
  content: ["./app/**/*.tsx", "./components/**/*.tsx"],
  theme: {
    extend: {
      colors: Object.fromEntries(
        [
          "paper",
          "surface",
          "ink",
          "muted",
          "hair",
          "rule",
          "accent",
          "on-accent",
          "accent-soft",
          "band",
          "edge",
          "edge-soft",
          "edge-fill",
          "outside",
          "outside-soft",
          "unm",
          "unm-soft",
          "unm-line",
          "on-state",
          "grid",
        ].map((name) => [name, token(name)]),
      ),
      fontFamily: { words: "var(--words)", nums: "var(--nums)" },
      screens: { tablet: "640px", desk: "1200px" },
    },
  },
};

export default config;
