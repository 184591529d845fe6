import type { SessionView } from '@brimgate/rules';
import { useEffect, useRef, useState } from 'react';
import { Dialog } from '../../components/dialog';
import { registerSignInAgain } from '../../lib/session-expiry';
import { useSignInAgain } from './accounts.queries';
import { SignInForm } from './sign-in-form';

/** Opens in place when the session has ended; the call that found out goes through afterwards, so nothing typed is lost. */
export function SignInAgainDialog({ session }: { session: SessionView }) {
  const [isOpen, setIsOpen] = useState(false);
  const answer = useRef<((hasSignedIn: boolean) => void) | null>(null);
  const signIn = useSignInAgain(session.membership.id);

  useEffect(() => {
    const unregister = registerSignInAgain(
      () =>
        new Promise<boolean>((resolve) => {
          answer.current = resolve;
          setIsOpen(true);
        }),
    );
    return () => {
      unregister();
      // Nobody can answer a dialog that is gone: the calls that wait for it are refused.
      answer.current?.(false);
      answer.current = null;
    };
  }, []);

  const finish = (hasSignedIn: boolean) => {
    setIsOpen(false);
    answer.current?.(hasSignedIn);
    answer.current = null;
  };

  return (
    <Dialog
      isOpen={isOpen}
      onClose={() => finish(false)}
      title="Your session has ended"
      description="What you typed is still here. Sign in again, and what you were doing goes on."
    >
      <SignInForm
        fixedEmail={session.person.email}
        onSignIn={async (input) => {
          await signIn.mutateAsync(input);
          finish(true);
        }}
      />
    </Dialog>
  );
}
