import type { Metadata } from "next";
import { NotFoundMessage } from "@/components/shell/messages";

export const metadata: Metadata = { title: "Not found" };

export default function NotFound() {
  return <NotFoundMessage />;
}
