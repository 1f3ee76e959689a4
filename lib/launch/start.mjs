import { runSite } from "./site.mjs";

await runSite({ name: "npm start", command: "start", built: true });
