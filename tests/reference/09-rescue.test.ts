import { describe } from "vitest";
import { runPublishedValues } from "./run-published-values";

describe("Rescue measures", () => runPublishedValues("09-rescue"));
