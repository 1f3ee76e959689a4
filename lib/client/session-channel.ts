const CHANNEL = "neaptide-session";
/** next-auth tells of a sign-out by writing this key. */
const NEXT_AUTH_KEY = "nextauth.message";

/** Says to this browser's other tabs that somebody signed in or unlocked: each asks the server for itself. */
export function tellOtherTabs(): void {
  if (typeof BroadcastChannel === "undefined") return;
  const channel = new BroadcastChannel(CHANNEL);
  channel.postMessage("changed");
  channel.close();
}

/** Hears when the session changed in another tab. */
export function onOtherTabs(listener: () => void): () => void {
  const channel = typeof BroadcastChannel === "undefined" ? null : new BroadcastChannel(CHANNEL);
  const stored = ({ key }: StorageEvent) => key === NEXT_AUTH_KEY && listener();
  channel?.addEventListener("message", listener);
  addEventListener("storage", stored);
  return () => {
    channel?.close();
    removeEventListener("storage", stored);
  };
}
