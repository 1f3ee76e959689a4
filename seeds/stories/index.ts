import type { Story } from "../story";
import { east } from "./east";
import { harbourInside } from "./harbour-inside";
import { harbourOutside } from "./harbour-outside";
import { harbourUnmeasured } from "./harbour-unmeasured";
import { kaplan } from "./kaplan";

export const stories: readonly Story[] = [kaplan, ...harbourOutside, ...harbourUnmeasured, ...harbourInside, ...east];
