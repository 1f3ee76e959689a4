import { describe } from "vitest";
import { runPublishedValues } from "./run-published-values";

describe("Height surrogates", () => runPublishedValues("02-height-surrogate"));
