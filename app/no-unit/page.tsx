import type { Metadata } from "next";
import { MessagePage } from "@/components/shell/message-page";
import { SignOutButton } from "@/components/shell/sign-out-button";
import { readMe } from "@/lib/access/read-me";
import { pageRead } from "@/lib/http/page";

export const metadata: Metadata = { title: "No unit" };

/** For those who belong to no unit: an administrator sees no patients. */
export default async function NoUnitPage() {
  const me = await pageRead({ access: "session:own", read: (ctx) => readMe(ctx) });
  return (
    <MessagePage title="No unit of yours" actions={<SignOutButton />}>
      <p>
        {me.administrator
          ? `${me.user.name}, as an administrator you see no patients here. Administration has no screens yet.`
          : `${me.user.name}, you do not belong to a unit yet. Ask your administrator.`}
      </p>
    </MessagePage>
  );
}
