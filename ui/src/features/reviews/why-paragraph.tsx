import type { Finding } from '@brimgate/rules';
import { whySentences } from './why-sentences';

/** Why the version is at the desk, in one paragraph of the findings' own words. */
export function WhyParagraph({ findings }: { findings: readonly Finding[] }) {
  const { asking, notDetermined } = whySentences(findings);
  if (asking.length === 0 && notDetermined.length === 0)
    return <p>Every finding that can ask for a signature is within its limit.</p>;
  return (
    <>
      {asking.length > 0 && <p>{asking.join(' ')}</p>}
      {notDetermined.length > 0 && <p>{notDetermined.join(' ')}</p>}
    </>
  );
}
