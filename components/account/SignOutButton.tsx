"use client";
import { LogOut } from "lucide-react";
import { signOut } from "next-auth/react";
import { useState } from "react";
import { Button } from "@/components/ui/Button";

export function SignOutButton() {
  const [busy, setBusy] = useState(false);
  return (
    <Button look="plain" size="small" busy={busy} icon={<LogOut aria-hidden />} onClick={() => { setBusy(true); signOut({ callbackUrl: "/sign-in" }).catch(() => setBusy(false)); }}>
      Sign out
    </Button>
  );
}
