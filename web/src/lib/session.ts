import { errorCode } from './error-code';

type SessionEnd = 'expired' | 'signed-out';

interface Session {
  /** The access token, kept in memory only; undefined before the first renewal and after the end. */
  token(): string | undefined;
  start(accessToken: string): void;
  end(why: SessionEnd): void;
  /**
   * A token that is not `rejected`: the present one if another request has renewed it meanwhile, else a new one.
   * Any number of callers share one request. Throws what the request throws.
   */
  renew(rejected?: string): Promise<string>;
  /** Calls `listener` each time the session ends; gives back how to stop listening. */
  onEnd(listener: (why: SessionEnd) => void): () => void;
}

export function createSession(requestToken: () => Promise<string>): Session {
  let token: string | undefined;
  let renewal: Promise<string> | undefined;
  const listeners = new Set<(why: SessionEnd) => void>();

  function end(why: SessionEnd) {
    token = undefined;
    listeners.forEach((listener) => listener(why));
  }

  async function request(): Promise<string> {
    try {
      token = await oneTabAtATime(requestToken);
      return token;
    } catch (error) {
      // Only a clear refusal ends the session; a lost connection must not sign anyone out.
      if (errorCode(error) === 'UNAUTHENTICATED') end('expired');
      throw error;
    } finally {
      renewal = undefined;
    }
  }

  return {
    token: () => token,
    start(accessToken) {
      token = accessToken;
    },
    end,
    async renew(rejected) {
      if (token && token !== rejected) return token;
      renewal ??= request();
      return renewal;
    },
    onEnd(listener) {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
  };
}

// Each renewal turns the cookie over, so two tabs renewing at once would make one of them present a used cookie.
function oneTabAtATime(work: () => Promise<string>): Promise<string> {
  if (!navigator.locks) return work();
  return navigator.locks.request<Promise<string>>('metewand.session', work);
}
