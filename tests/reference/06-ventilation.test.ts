import { describe } from "vitest";
import { runPublishedValues } from "./run-published-values";

describe("Ventilation and dead space", () => runPublishedValues("06-ventilation"));
