import { useEffect } from 'react';
import { useNavigate, useSearchParams } from 'react-router-dom';
import { Mark } from '../app/mark';
import { Disclaimer } from '../components/disclaimer';
import { useSignIn } from '../features/accounts/accounts.queries';
import { SignInForm } from '../features/accounts/sign-in-form';
import { paths } from '../paths';
import styles from './sign-in-page.module.css';

// Only our own pages: an address with a host would lead people elsewhere after signing in.
const isOwnPath = (to: string | null): to is string => to !== null && /^\/(?![/\\])/.test(to);

export default function SignInPage() {
  const navigate = useNavigate();
  const [search] = useSearchParams();
  const signIn = useSignIn();
  const to = search.get('to');

  useEffect(() => {
    document.title = 'Sign in · Brimgate';
  }, []);

  return (
    <main className={styles.page}>
      <p className={styles.brand}>
        <Mark />
        Brimgate
      </p>
      <h1 className={styles.title}>Sign in</h1>
      <p className={styles.lead}>
        {isOwnPath(to)
          ? 'You were signed out. Sign in, and you come back to where you were.'
          : 'Ration and water screened together, reviewed, released and accounted for.'}
      </p>
      <SignInForm
        onSignIn={async (input) => {
          await signIn.mutateAsync(input);
          await navigate(isOwnPath(to) ? to : paths.work(), { replace: true });
        }}
      />
      <Disclaimer />
    </main>
  );
}
