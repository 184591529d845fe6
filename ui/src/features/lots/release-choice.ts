import type { LotView, ReleaseView } from '@brimgate/rules';
import type { SelectOption } from '../../components/select-field';
import { formatMoment } from '../../lib/format';

const endWords: Readonly<Record<ReleaseView['state'], string>> = {
  released: '',
  superseded: ', since superseded',
  stopped: ', since stopped',
};

/** A release as a lot's form offers it: "Finisher 4, version 6, released 3 May 2026, 10:42 (America/Chicago)". */
function releaseChoice(release: ReleaseView, timeZone: string): SelectOption {
  const released = formatMoment(release.releasedAt, timeZone);
  return {
    value: release.id,
    label: `${release.ration.name}, version ${release.versionNumber}, released ${released}${endWords[release.state]}`,
  };
}

/** What a lot may have been fed; what is on record stays a choice though it is not among the newest. */
export function releaseChoices(
  releases: readonly ReleaseView[],
  fed: LotView['release'],
  timeZone: string,
): SelectOption[] {
  const choices = releases.map((release) => releaseChoice(release, timeZone));
  if (fed === null || choices.some((choice) => choice.value === fed.id)) return choices;
  return [...choices, { value: fed.id, label: `${fed.rationName}, version ${fed.versionNumber}` }];
}
