import type { AdvisoryPreview } from '@brimgate/rules';
import { Tabs } from '@radix-ui/themes';
import { MailFrame } from '../../components/mail-frame';
import { Section } from '../../components/section';
import styles from './advisory-preview-section.module.css';

const roleWords = { yard: 'the yard', veterinarian: 'the herd’s veterinarian' } as const;

/** The mail as it would go out, by the same path as the real one, and to whom. */
export function AdvisoryPreviewSection({ preview }: { preview: AdvisoryPreview }) {
  return (
    <Section title="Advisory to the yard" aside="preview; nothing has been sent">
      <dl className={styles.head}>
        <div>
          <dt>To</dt>
          <dd>
            {preview.recipients.length === 0 && 'nobody: the yard has no address for advisories'}
            {preview.recipients.map(({ address, role }) => (
              <span key={address} className={styles.recipient}>
                {address} <span className={styles.quiet}>({roleWords[role]})</span>
              </span>
            ))}
          </dd>
        </div>
        <div>
          <dt>Subject</dt>
          <dd>{preview.subject}</dd>
        </div>
      </dl>
      <Tabs.Root defaultValue="html">
        <Tabs.List aria-label="Parts of the mail" color="bronze" highContrast>
          <Tabs.Trigger value="html">As mailed</Tabs.Trigger>
          <Tabs.Trigger value="text">Plain text</Tabs.Trigger>
        </Tabs.List>
        <Tabs.Content value="html" className={styles.part}>
          <MailFrame title="Advisory e-mail, preview" html={preview.html} />
        </Tabs.Content>
        <Tabs.Content value="text" className={styles.part}>
          <pre className={styles.text}>{preview.text}</pre>
        </Tabs.Content>
      </Tabs.Root>
    </Section>
  );
}
