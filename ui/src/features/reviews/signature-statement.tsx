import type { SignerRole } from '@brimgate/rules';
import { useEffect, useState } from 'react';
import { formatMoment } from '../../lib/format';
import { useSession } from '../../lib/session';
import { shortHash, signerWords } from './signer-words';

const MINUTE_MS = 60_000;

/** Exactly what the signature will say: who, as what, when in the yard's zone, and for which content. */
export function SignatureStatement({
  as,
  timeZone,
  contentHash,
}: {
  as: SignerRole;
  timeZone: string;
  contentHash: string;
}) {
  const { person } = useSession();
  const now = useMinute();
  const licence = person.licence ? `, ${person.licence}` : '';
  return (
    <>
      Signs as {person.name}
      {licence}, {signerWords[as]}, {formatMoment(now, timeZone)}, for exactly this content: {shortHash(contentHash)}.
    </>
  );
}

function useMinute(): string {
  const [now, setNow] = useState(() => new Date().toISOString());
  useEffect(() => {
    const timer = setInterval(() => setNow(new Date().toISOString()), MINUTE_MS / 2);
    return () => clearInterval(timer);
  }, []);
  return now;
}
