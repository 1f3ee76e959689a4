import { describe } from "vitest";
import { runPublishedValues } from "./run-published-values";

describe("Units and codes", () => runPublishedValues("13-units"));
