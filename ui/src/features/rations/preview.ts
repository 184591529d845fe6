import { NEWEST_EDITION } from '@brimgate/reference-tables';
import {
  assembleScreeningRequest,
  type FeedstuffListItem,
  type RequestProblem,
  screen,
  type Screening,
  type ScreeningRequest,
  type WaterSourceView,
  type YardView,
} from '@brimgate/rules';
import { contentFromValues } from './ration-content';
import type { RationValues } from './ration-values';

/** A screening with what it was made from. */
export interface Screened {
  screening: Screening;
  request: ScreeningRequest;
}

export interface PreviewFacts {
  feedstuffs: readonly FeedstuffListItem[];
  waterSources: readonly WaterSourceView[];
  yard: YardView;
}

export interface Preview {
  screened: Screened | null;
  /** What the ration still lacks before it can be screened, in one sentence; '' when nothing. */
  wanting: string;
}

const notYet = (wanting: string): Preview => ({ screened: null, wanting });

/** What is screened while somebody types: the server's own calculation, on the facts that came with the page. */
export function previewOf(values: RationValues, facts: PreviewFacts): Preview {
  const content = contentFromValues(values);
  if (!content.isValid)
    return notYet(
      wantingWords(
        values,
        content.faults.map(({ path }) => path),
      ),
    );
  const { request, problems } = assembleScreeningRequest({
    content: content.output,
    feedstuffs: facts.feedstuffs,
    waters: facts.waterSources.flatMap(({ analyses }) => analyses),
    yard: facts.yard,
    edition: NEWEST_EDITION,
  });
  if (problems) return notYet(problems.map(problemWords).join(' '));
  return { screened: { request, screening: screen(request) }, wanting: '' };
}

/** Only the newest analyses of a water come with the page; an older one is for the server to look up. */
const problemWords = ({ path, message }: RequestProblem): string =>
  path.endsWith('waterAnalysisId')
    ? 'it goes with an older water analysis, which only the server holds; screen and keep it to see the findings.'
    : `${message}.`;

/** The gaps that stand first on the page come first. */
function wantingWords(values: RationValues, paths: readonly string[]): string {
  const has = (test: (path: string) => boolean) => paths.some(test);
  const parts = [
    values.lines.length === 0 && 'at least one feedstuff',
    has((path) => /^lines\.\d/.test(path)) && 'a feedstuff and a share in every line',
    has((path) => path === 'lines') && values.lines.length > 0 && 'shares that add to 100',
    has((path) => path.startsWith('waters')) && 'waters with shares that add to 100',
    has((path) => path.startsWith('waterIntake')) && 'the figure of the water intake',
    has((path) => path === 'cattle.stage') && 'the stage of the cattle',
    has((path) => path === 'cattle.bodyWeightKg') && 'their body weight',
    has((path) => path.startsWith('cattle.') && path !== 'cattle.stage' && path !== 'cattle.bodyWeightKg') &&
      'figures of the cattle that can be read',
  ].filter((part) => part !== false);
  return `it wants ${parts.join(', ')}.`;
}
