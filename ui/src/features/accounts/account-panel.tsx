import type { SessionView } from '@brimgate/rules';
import { useNavigate } from 'react-router-dom';
import { Button } from '../../components/button';
import { ProblemNotice } from '../../components/problem-notice';
import { SelectField } from '../../components/select-field';
import { chooseTheme, themeChoices, useThemeChoice } from '../../lib/theme-choice';
import styles from './account-panel.module.css';
import { useChooseMembership, useSignOut } from './accounts.queries';
import { roleWords, yardWords } from './role-words';

const themeWords = { system: 'As the system', light: 'Light', dark: 'Dark' } as const;

interface AccountPanelProps {
  session: SessionView;
  /** The address to go to after another firm was chosen, and after signing out. */
  workPath: string;
  signInPath: string;
}

/** Who is signed in, for which firm, in which theme; and the way out. */
export function AccountPanel({ session, workPath, signInPath }: AccountPanelProps) {
  const navigate = useNavigate();
  const theme = useThemeChoice();
  const signOut = useSignOut();
  const { person, membership } = session;
  return (
    <div className={styles.panel}>
      <div>
        <p className={styles.name}>{person.name}</p>
        <p className={styles.quiet}>
          {roleWords[membership.role]}, {membership.firm.name}
        </p>
        <p className={styles.quiet}>{membership.yards.map((yard) => yard.name).join(', ')}</p>
      </div>
      <MembershipSwitch session={session} workPath={workPath} />
      <SelectField
        label="Theme"
        options={themeChoices.map((choice) => ({ value: choice, label: themeWords[choice] }))}
        value={theme}
        onChange={(event) => chooseTheme(themeChoices.find((choice) => choice === event.target.value) ?? 'system')}
      />
      {signOut.error && <ProblemNotice problem={signOut.error} />}
      <Button
        busyText={signOut.isPending && 'Signing out …'}
        onClick={() => signOut.mutate(undefined, { onSuccess: () => void navigate(signInPath) })}
      >
        Sign out
      </Button>
    </div>
  );
}

/** For people who work for several firms: only one is seen at a time. */
function MembershipSwitch({ session, workPath }: { session: SessionView; workPath: string }) {
  const navigate = useNavigate();
  const choose = useChooseMembership();
  if (session.memberships.length < 2) return null;
  return (
    <>
      <SelectField
        label="Working for"
        options={session.memberships.map((membership) => ({
          value: membership.id,
          label: `${membership.firm.name}: ${roleWords[membership.role]}, ${yardWords(membership.role, membership.yards)}`,
        }))}
        value={session.membership.id}
        disabled={choose.isPending}
        onChange={(event) =>
          choose.mutate({ membershipId: event.target.value }, { onSuccess: () => void navigate(workPath) })
        }
      />
      {choose.error && <ProblemNotice problem={choose.error} />}
    </>
  );
}
