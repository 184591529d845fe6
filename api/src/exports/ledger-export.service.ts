import { pipeline, Readable } from 'node:stream';
import { cautionOf } from '@brimgate/reference-tables';
import { type LedgerQuery, summaryColumns } from '@brimgate/rules';
import { Injectable, Logger, StreamableFile } from '@nestjs/common';
import { stringify } from 'csv-stringify';
import { yardTime } from '../advisories/yard-time';
import type { CurrentUser } from '../common/current-user';
import { LedgerLots, type Period } from '../ledger/ledger-lots.service';
import { toLotView } from '../lots/lot.view';
import { type Cell, csvRow } from './csv-cells';
import { sourceLines } from './source-lines';

/** The nutrient ledger as a file: stored figures written out row by row, none computed anew. */
@Injectable()
export class LedgerExport {
  private readonly logger = new Logger(LedgerExport.name);

  constructor(private readonly ledgerLots: LedgerLots) {}

  async csv({ user, query }: { user: CurrentUser; query: LedgerQuery }): Promise<StreamableFile> {
    // What can be refused is refused here, before the first byte is out.
    const period = await this.ledgerLots.period({ user, query });
    const head = await this.head(period);
    const file = stringify({ bom: true, record_delimiter: 'windows' });
    pipeline(Readable.from(this.rows(period, head)), file, (error) => {
      if (error) this.logger.warn(`A ledger file was cut off: ${error.message}`);
    });
    return new StreamableFile(file, {
      type: 'text/csv; charset=utf-8',
      disposition: `attachment; filename="${fileName(period)}"`,
    });
  }

  private async head({ user, yard, from, to, ...rest }: Period): Promise<Cell[][]> {
    const bases = await this.ledgerLots.bases({ user, yard, from, to, ...rest });
    return [
      ['Nutrient ledger', 'estimate, not analysis'],
      ['Firm', user.firmName],
      ['Yard', yard.name],
      ['Lots that ended', `${from} to ${to}, both days included`],
      ['Written', yardTime(new Date(), yard.timeZone)],
      ['Written by', user.name],
      [
        'Rules and reference tables',
        bases.map(({ rulesVersion, edition }) => `rules ${rulesVersion}, tables of edition ${edition}`).join('; '),
      ],
      [],
    ];
  }

  private async *rows(period: Period, head: readonly Cell[][]): AsyncGenerator<string[]> {
    for (const line of head) yield csvRow(line);
    yield csvRow(summaryColumns.map((column) => column.title));
    const sourceIds = new Set(summaryColumns.flatMap((column) => column.sourceIds));
    for await (const lot of this.ledgerLots.each(period)) {
      lot.excretion.steps.forEach((step) => sourceIds.add(step.sourceId));
      const view = toLotView(lot);
      yield csvRow(summaryColumns.map((column) => column.cell(view)));
    }
    for (const line of foot([...sourceIds])) yield csvRow(line);
  }
}

function foot(sourceIds: readonly string[]): Cell[][] {
  const { whatIsWrong, whatFollows, howToAvoid } = cautionOf('estimate-not-analysis');
  return [
    [],
    ['A figure that reads "not determined" is unknown, not zero, and stands in no sum.'],
    ['N, P and K are the elements: P is not P2O5, K is not K2O. Weights are live or shrunk as "Weight basis" says.'],
    [`Estimate, not analysis. ${whatIsWrong} ${whatFollows} ${howToAvoid}`],
    ['Screening aid, not veterinary or legal advice. Local nutrient-management rules and the licensed planner decide.'],
    ...sourceLines(sourceIds).map((line) => ['Source', line]),
  ];
}

/** Letters, digits and hyphens only: it goes into a header and onto any disk. */
function fileName({ yard, from, to }: Period): string {
  const name = yard.name
    .normalize('NFKD')
    .replace(/[^A-Za-z0-9]+/g, '-')
    .replace(/^-|-$/g, '')
    .toLowerCase();
  return `nutrient-ledger-${name === '' ? 'yard' : name}-${from}-${to}.csv`;
}
