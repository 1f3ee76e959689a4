import { unlockRoute } from "@/lib/http/unlock-route";

export const POST = unlockRoute();
