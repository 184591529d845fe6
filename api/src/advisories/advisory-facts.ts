import { cautionOf, type Caution } from '@brimgate/reference-tables';
import type { Finding, Screening, ScreeningRequest, SignerRole } from '@brimgate/rules';
import { feedingFacts, type FeedingFacts } from './feeding-facts';
import { findingFacts, type FindingFacts, findingTitle, statusWord } from './finding-facts';
import { yardTime } from './yard-time';

/** What the advisory is written from, as stored. */
export type AdvisoryMatter = {
  kind: 'release' | 'stop';
  firmName: string;
  yard: { name: string; timeZone: string };
  rationName: string;
  versionNumber: number;
  contentHash: string;
  request: ScreeningRequest;
  screening: Screening;
  actedBy: string;
  actedAt: Date;
  /** Why it is fed all the same, or why it is stopped. */
  reason: string | null;
  signatures: readonly {
    signedAs: SignerRole;
    signerName: string;
    signerLicence: string | null;
    signedAt: Date;
    conditions: readonly string[];
  }[];
  link: string;
};

type SignatureFacts = { role: string; signer: string; moment: string; conditions: string[] };

/** What both templates are filled from; texts only. */
export type AdvisoryFacts = FeedingFacts & {
  subject: string;
  preheader: string;
  firmName: string;
  yardName: string;
  rationName: string;
  versionNumber: number;
  contentHash: string;
  actedBy: string;
  actedAt: string;
  reason: string | null;
  /** What is over stands before what is near. */
  flagged: FindingFacts[];
  undetermined: FindingFacts[];
  rest: FindingFacts[];
  assumptions: string[];
  cautions: Pick<Caution, 'title' | 'whatIsWrong' | 'whatFollows' | 'howToAvoid'>[];
  signatures: SignatureFacts[];
  /** All of them, of every signature: they stand first, because they say how it may be fed. */
  conditions: string[];
  notices: string[];
  edition: string;
  rulesVersion: string;
  link: string;
};

// One line whatever a name holds: a subject with a line break would begin a header of its own.
const asOneLine = (text: string) => text.replace(/[\p{Cc}\s]+/gu, ' ').trim();

const isOver = ({ applies, status }: Finding) => applies && status === 'over';
const isNear = ({ applies, status }: Finding) => applies && status === 'near';
const isUndetermined = ({ applies, status }: Finding) => applies && status === 'undetermined';

function headlineOf({ findings, edition, verdict }: Screening): string {
  const grave = findings.filter(
    (finding) => finding.applies && finding.status === verdict && finding.signOff !== 'notice',
  );
  if (verdict === 'within' || grave.length === 0) return 'within the limits it was screened against';
  const [first] = grave;
  const others = grave.length > 1 ? ` and ${grave.length - 1} more` : '';
  return first === undefined ? '' : `${findingTitle(first, edition).toLowerCase()} ${statusWord(first)}${others}`;
}

function subjectOf({ kind, yard, rationName, versionNumber, screening }: AdvisoryMatter): string {
  const what = `${rationName}, version ${versionNumber}`;
  const subject =
    kind === 'stop'
      ? `${yard.name}: stop feeding ${what}`
      : `${yard.name}: ${what} released (${headlineOf(screening)})`;
  return asOneLine(subject).slice(0, 300);
}

/** Signs of nervous disease and the change of diet always; urea whenever NPN is fed or may be; then what the findings name. */
function cautionsOf({ totals, findings }: Screening): Caution[] {
  const isNpnFree = totals.npnProteinEquivalentPctDm === 0;
  const raised = findings.filter((finding) => finding.applies && finding.status !== 'within');
  const ids = new Set(['pem-signs', 'transition', ...(isNpnFree ? [] : ['urea-toxicity'])]);
  raised.flatMap((finding) => finding.cautions).forEach((id) => ids.add(id));
  return [...ids, 'call-veterinarian'].filter((id, index, all) => all.indexOf(id) === index).map(cautionOf);
}

const inOneParagraph = ({ whatIsWrong, whatFollows, howToAvoid }: Caution) =>
  `${whatIsWrong} ${whatFollows} ${howToAvoid}`;

export function advisoryFacts(matter: AdvisoryMatter): AdvisoryFacts {
  const { screening, yard } = matter;
  const { findings, edition } = screening;
  const inWords = (finding: Finding) => findingFacts(finding, edition);
  const signatures = matter.signatures.map((signature) => ({
    role: signature.signedAs === 'veterinarian' ? 'Veterinarian' : 'Compliance',
    signer: [signature.signerName, signature.signerLicence].filter((part) => part !== null).join(', '),
    moment: yardTime(signature.signedAt, yard.timeZone),
    conditions: [...signature.conditions],
  }));
  return {
    ...feedingFacts(matter.request, screening.totals),
    subject: subjectOf(matter),
    preheader: headlineOf(screening),
    firmName: matter.firmName,
    yardName: yard.name,
    rationName: matter.rationName,
    versionNumber: matter.versionNumber,
    contentHash: matter.contentHash,
    actedBy: matter.actedBy,
    actedAt: yardTime(matter.actedAt, yard.timeZone),
    reason: matter.reason,
    flagged: [...findings.filter(isOver), ...findings.filter(isNear)].map(inWords),
    undetermined: findings.filter(isUndetermined).map(inWords),
    rest: findings.filter(({ applies, status }) => applies && status === 'within').map(inWords),
    assumptions: [...screening.assumptions],
    cautions: cautionsOf(screening),
    signatures,
    conditions: signatures.flatMap((signature) => signature.conditions),
    notices: [inOneParagraph(cautionOf('screening-aid')), inOneParagraph(cautionOf('local-rules'))],
    edition,
    rulesVersion: screening.rulesVersion,
    link: matter.link,
  };
}
