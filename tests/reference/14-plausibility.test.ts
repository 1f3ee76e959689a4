import { describe } from "vitest";
import { runPublishedValues } from "./run-published-values";

describe("Plausibility limits", () => runPublishedValues("14-plausibility"));
