import { meSchema, sessionAnswerSchema, type Me } from "@/lib/contracts";
import { request } from "./api";
import { serverNow } from "./server-clock";
import type { SessionLoss } from "./session-loss";

const MINUTE_MS = 60_000;
const IDLE_MS = 15 * MINUTE_MS;
/** With no network nobody could unlock, so a page in use stays open; not for longer than this. */
const LONGEST_OFFLINE_MS = 60 * MINUTE_MS;
const WARNED_MS = 15 * MINUTE_MS;

export interface SessionState {
  loss: SessionLoss | null;
  /** Whole minutes to the end of the 12 h, in its last 15; null before. */
  endsInMinutes: number | null;
}

export interface SessionWatch {
  state: () => SessionState;
  subscribe: (listener: () => void) => () => void;
  /** A key or a touch. Told to the server once a minute at most. */
  act: () => void;
  /** Looks at the clock, and asks the server before locking: another tab may have been used meanwhile. */
  check: () => Promise<void>;
  lose: (loss: SessionLoss) => void;
  /** Unlocked or signed in again, here or in another tab. */
  opened: (session: Me["session"]) => void;
}

const open: SessionState = { loss: null, endsInMinutes: null };

function stateStore() {
  const listeners = new Set<() => void>();
  let state = open;
  return {
    state: () => state,
    become: (next: Partial<SessionState>) => {
      state = { ...state, ...next };
      listeners.forEach((listener) => listener());
    },
    subscribe: (listener: () => void) => {
      listeners.add(listener);
      return () => void listeners.delete(listener);
    },
  };
}

/**
 * Follows one session from the browser's side. The server decides; this only keeps a locked or ended session from
 * showing its page until the next request would have told.
 */
export function watchSession(session: Me["session"]): SessionWatch {
  const { state, become, subscribe } = stateStore();
  let endsMs = Date.parse(session.endsAt);
  let lastActionMs = Date.parse(session.lastActionAt);
  let sentMs = lastActionMs;

  const heard = (lastActionAt: string) => {
    lastActionMs = Math.max(lastActionMs, Date.parse(lastActionAt));
  };

  /** A 401 is told to every listener by `request`; any other failure is tried again at the next key. */
  async function send(): Promise<void> {
    const earlier = sentMs;
    sentMs = serverNow();
    await request({ path: "/api/session/activity", body: {}, answer: sessionAnswerSchema })
      .then(({ lastActionAt }) => heard(lastActionAt))
      .catch(() => (sentMs = earlier));
  }

  async function ask(idleMs: number): Promise<void> {
    await request({ path: "/api/me", answer: meSchema })
      .then((me) => heard(me.session.lastActionAt))
      .catch(() => idleMs >= LONGEST_OFFLINE_MS && become({ loss: "locked" }));
  }

  function warn(leftMs: number): void {
    const endsInMinutes = leftMs <= WARNED_MS ? Math.ceil(leftMs / MINUTE_MS) : null;
    if (endsInMinutes !== state().endsInMinutes) become({ endsInMinutes });
  }

  return {
    state,
    subscribe,
    act: () => {
      if (state().loss === null && serverNow() - sentMs >= MINUTE_MS) void send();
    },
    check: async () => {
      if (state().loss !== null) return;
      const now = serverNow();
      if (now >= endsMs) return become({ loss: "not-signed-in" });
      warn(endsMs - now);
      if (now - lastActionMs >= IDLE_MS) await ask(now - lastActionMs);
    },
    lose: (loss) => become({ loss }),
    opened: (anew) => {
      endsMs = Date.parse(anew.endsAt);
      lastActionMs = Date.parse(anew.lastActionAt);
      sentMs = lastActionMs;
      become(open);
    },
  };
}
