import { describe } from "vitest";
import { runPublishedValues } from "./run-published-values";

describe("Predicted body weight", () => runPublishedValues("01-pbw"));
