import type { AdvisoryView } from '@brimgate/rules';
import { Tabs } from '@radix-ui/themes';
import { MailFrame } from '../../components/mail-frame';
import styles from './advisory-mail.module.css';

/** The mail as it was frozen when it was written, in both its parts. */
export function AdvisoryMail({ advisory }: { advisory: Pick<AdvisoryView, 'subject' | 'html' | 'text'> }) {
  return (
    <Tabs.Root defaultValue="html">
      <Tabs.List aria-label="Parts of the mail" color="bronze" highContrast>
        <Tabs.Trigger value="html">As mailed</Tabs.Trigger>
        <Tabs.Trigger value="text">Plain text</Tabs.Trigger>
      </Tabs.List>
      <Tabs.Content value="html" className={styles.part}>
        <MailFrame title={`Mail: ${advisory.subject}`} html={advisory.html} />
      </Tabs.Content>
      <Tabs.Content value="text" className={styles.part}>
        <pre className={styles.text}>{advisory.text}</pre>
      </Tabs.Content>
    </Tabs.Root>
  );
}
