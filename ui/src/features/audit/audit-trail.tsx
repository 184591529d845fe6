import type { AuditEventView } from '@brimgate/rules';
import { Link } from 'react-router-dom';
import { formatDate, formatTime } from '../../lib/format';
import { auditDays } from './audit-days';
import styles from './audit-trail.module.css';

interface AuditTrailProps {
  events: readonly AuditEventView[];
  /** Where only what was done to one subject is shown; null while that is shown already. */
  subjectPath: ((subjectId: string) => string) | null;
}

/** What was done, by whom, as sentences, newest first. Times are UTC: the yards lie in several zones. */
export function AuditTrail({ events, subjectPath }: AuditTrailProps) {
  return auditDays(events).map((day) => (
    <section key={day.date} className={styles.day} aria-label={formatDate(day.date)}>
      <h2 className={styles.date}>{formatDate(day.date)}</h2>
      <ol className={styles.events}>
        {day.events.map((event) => (
          <li key={event.id} className={styles.event}>
            <time className={styles.time} dateTime={event.at}>
              {formatTime(event.at, 'UTC')}
            </time>
            <AuditEvent event={event} subjectPath={subjectPath} />
          </li>
        ))}
      </ol>
    </section>
  ));
}

function AuditEvent({ event, subjectPath }: { event: AuditEventView } & Pick<AuditTrailProps, 'subjectPath'>) {
  return (
    <div className={styles.words}>
      <p>{event.sentence}</p>
      <p className={styles.fine}>
        {event.person}, {event.role.replace('-', ' ')}
        {event.yard && `, ${event.yard}`}
        {subjectPath && (
          <>
            {' · '}
            <Link to={subjectPath(event.subject.id)}>all that was done to {event.subject.name}</Link>
          </>
        )}
      </p>
      {event.changes.length > 0 && (
        <ul className={styles.changes}>
          {event.changes.map((change, index) => (
            <li key={index}>
              <AuditChange change={change} />
            </li>
          ))}
        </ul>
      )}
    </div>
  );
}

/** What was told beside the act has nothing before it; what changed has both. */
function AuditChange({ change: { field, before, after } }: { change: AuditEventView['changes'][number] }) {
  if (before === null) return `${field}: ${after ?? 'none'}`;
  return (
    <>
      {field}: <del>{before}</del> <span aria-hidden="true">→</span> <ins>{after ?? 'none'}</ins>
    </>
  );
}
