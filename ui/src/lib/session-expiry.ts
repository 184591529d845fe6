/** Asks the person to sign in again in place; resolves to whether they did. */
type AskToSignIn = () => Promise<boolean>;

let askToSignIn: AskToSignIn | null = null;
let asking: Promise<boolean> | null = null;

/** The signed-in layout registers its dialog here; the answer unregisters it. */
export function registerSignInAgain(ask: AskToSignIn): () => void {
  askToSignIn = ask;
  return () => {
    if (askToSignIn === ask) askToSignIn = null;
  };
}

/** One dialog for all calls that find the session expired at the same time. */
export function signInAgain(): Promise<boolean> {
  if (!askToSignIn) return Promise.resolve(false);
  asking ??= askToSignIn().finally(() => {
    asking = null;
  });
  return asking;
}
