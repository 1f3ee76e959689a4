"use client";

import { signOut } from "next-auth/react";
import { Button } from "@/components/ui/button";

export function SignOutButton() {
  return (
    <Button look="primary" size="bar" onClick={() => void signOut({ callbackUrl: "/sign-in" })}>
      Sign out
    </Button>
  );
}
