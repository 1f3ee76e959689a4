import type { Metadata } from "next";
import { ForbiddenMessage } from "@/components/shell/messages";

export const metadata: Metadata = { title: "Not for your role" };

export default function Forbidden() {
  return <ForbiddenMessage />;
}
