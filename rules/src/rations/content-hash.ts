import { NEWEST_EDITION } from '@brimgate/reference-tables';
import { canonicalJson } from '../quantities/canonical-json';
import { RULES_VERSION } from '../rules-version';
import type { ScreeningRequest } from '../screenings/screening-request.schema';

/**
 * The text whose SHA-256 is the content hash: what a signature binds to.
 *
 * Lines with their shares and resolved compositions, waters, cattle, own limits, edition and rules version. Names, notes
 * and draws are left out, and the order of lines and waters does not count: none of them changes what is fed. The
 * composition's dry matter stays in, because it decides how much of the water comes with the feed.
 */
export function contentText(request: ScreeningRequest, rulesVersion: string = RULES_VERSION): string {
  const { edition = NEWEST_EDITION, cattle, lines, waters = [], waterIntake, transition, limits, yardCap } = request;
  return canonicalJson({
    cattle,
    edition,
    limits: limits ?? {},
    lines: inCanonicalOrder(lines.map(({ sharePctDm, composition, spread }) => ({ sharePctDm, composition, spread }))),
    rulesVersion,
    transition,
    waterIntake,
    waters: inCanonicalOrder(waters.map((water) => ({ ...water, name: undefined }))),
    yardCap: yardCap ?? {},
  });
}

const inCanonicalOrder = <Item>(items: readonly Item[]): Item[] =>
  items
    .map((item) => ({ item, text: canonicalJson(item) }))
    .sort((one, other) => (one.text < other.text ? -1 : 1))
    .map(({ item }) => item);
