import { authRoute } from "@/lib/http/auth-route";

export const GET = authRoute;
export const POST = authRoute;
