import { parseScreeningRequest, type RequestProblem } from './request-problems';
import { screen } from './screen';

export interface CommandResult {
  readonly exitCode: 0 | 2;
  readonly stdout: string;
  readonly stderr: string;
}

const refuse = (problems: readonly RequestProblem[]): CommandResult => ({
  exitCode: 2,
  stdout: '',
  stderr: problems.map(({ path, message }) => `${path}: ${message}\n`).join(''),
});

/** What the command answers to a text on standard input: the screening as JSON, or one readable line a problem. */
export function screenCommand(text: string): CommandResult {
  if (text.trim() === '') {
    return refuse([{ path: 'request', message: 'Nothing came on standard input; send a screening request as JSON' }]);
  }
  let input: unknown;
  try {
    input = JSON.parse(text);
  } catch (error) {
    const reason = error instanceof Error ? error.message.replaceAll('\n', ' ') : 'it could not be read';
    return refuse([{ path: 'request', message: `This is not JSON: ${reason}` }]);
  }
  const { request, problems } = parseScreeningRequest(input);
  if (problems) return refuse(problems);
  return { exitCode: 0, stdout: `${JSON.stringify(screen(request), null, 2)}\n`, stderr: '' };
}
