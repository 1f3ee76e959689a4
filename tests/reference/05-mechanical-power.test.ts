import { describe } from "vitest";
import { runPublishedValues } from "./run-published-values";

describe("Mechanical power", () => runPublishedValues("05-mech-power"));
