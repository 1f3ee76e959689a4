import { describe } from "vitest";
import { runPublishedValues } from "./run-published-values";

describe("Oxygenation", () => runPublishedValues("07-oxygenation"));
