import { describe } from "vitest";
import { runPublishedValues } from "./run-published-values";

describe("ARDS Network protocol", () => runPublishedValues("08-ardsnet"));
