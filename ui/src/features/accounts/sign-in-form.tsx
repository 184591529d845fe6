import { valibotResolver } from '@hookform/resolvers/valibot';
import { SignInInput } from '@brimgate/rules';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { Button } from '../../components/button';
import { ErrorSummary } from '../../components/error-summary';
import { TextField } from '../../components/text-field';
import { problemOf } from '../../lib/api-problem';
import { faultsOfForm, faultsToForm, type Fault } from '../../lib/form/faults-to-form';
import styles from './sign-in-form.module.css';

interface SignInFormProps {
  /** Signs in, or throws what the server refused. */
  onSignIn: (input: SignInInput) => Promise<unknown>;
  /** Given when somebody signs in again: the address is theirs and cannot be another. */
  fixedEmail?: string;
}

const isField = (path: string) => path === 'email' || path === 'password';

export function SignInForm({ onSignIn, fixedEmail }: SignInFormProps) {
  const [refusal, setRefusal] = useState<Fault[]>([]);
  const form = useForm({
    resolver: valibotResolver(SignInInput),
    defaultValues: { email: fixedEmail ?? '', password: '' },
    reValidateMode: 'onSubmit',
    shouldFocusError: false,
  });
  const { errors, isSubmitting, submitCount } = form.formState;

  const handleSubmit = form.handleSubmit(
    async (input) => {
      setRefusal([]);
      try {
        await onSignIn(input);
      } catch (error) {
        setRefusal(faultsToForm(problemOf(error), form.setError, isField));
      }
    },
    () => setRefusal([]),
  );

  return (
    <form className={styles.form} onSubmit={handleSubmit} noValidate>
      <ErrorSummary
        faults={[...faultsOfForm(errors), ...refusal]}
        title="You are not signed in yet"
        attempt={submitCount}
      />
      <TextField
        label="E-mail address"
        type="email"
        autoComplete="username"
        readOnly={fixedEmail !== undefined}
        error={errors.email?.message}
        {...form.register('email')}
      />
      <TextField
        label="Password"
        type="password"
        autoComplete="current-password"
        error={errors.password?.message}
        {...form.register('password')}
      />
      <Button kind="primary" type="submit" busyText={isSubmitting && 'Signing in …'}>
        Sign in
      </Button>
    </form>
  );
}
