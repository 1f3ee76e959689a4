import { describe } from "vitest";
import { runPublishedValues } from "./run-published-values";

describe("P/F and definitions of ARDS", () => runPublishedValues("03-pf-ards"));
