import { describe } from "vitest";
import { runPublishedValues } from "./run-published-values";

describe("Mechanics", () => runPublishedValues("04-mechanics"));
