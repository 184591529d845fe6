import { readFileSync } from 'node:fs';
import { screenCommand } from '../src/screenings/screen-command';

const STANDARD_INPUT = 0;

const { exitCode, stdout, stderr } = screenCommand(readFileSync(STANDARD_INPUT, 'utf8'));
process.stdout.write(stdout);
process.stderr.write(stderr);
process.exitCode = exitCode;
