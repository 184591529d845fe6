import { existsSync, readFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import type { RenderedAdvisory } from '@brimgate/rules';
import { Injectable } from '@nestjs/common';
import Handlebars from 'handlebars';
import { type AdvisoryFacts, advisoryFacts, type AdvisoryMatter } from './advisory-facts';

type Template = (facts: AdvisoryFacts) => string;

/** templates/ stands beside src in the sources and beside dist in a build. */
function templatesFolder(): string {
  for (let folder = __dirname; folder !== dirname(folder); folder = dirname(folder)) {
    const candidate = join(folder, 'templates');
    if (existsSync(join(candidate, 'advisory.html.hbs'))) return candidate;
  }
  throw new Error('The templates of the advisories are not where the program was installed');
}

/** Compiles a template that ships with the code; text from people only ever fills it. */
function compile(folder: string, name: string, kind: 'html' | 'text'): Template {
  const handlebars = Handlebars.create();
  for (const part of ['feeding', 'figures', 'findings', 'notices', 'signatures', 'watch']) {
    const file = join(folder, 'parts', `${part}.${kind}.hbs`);
    handlebars.registerPartial(part, readFileSync(file, 'utf8'));
  }
  const source = readFileSync(join(folder, `${name}.${kind}.hbs`), 'utf8');
  const options = { strict: true, knownHelpersOnly: true, noEscape: kind === 'text' };
  return handlebars.compile<AdvisoryFacts>(source, options);
}

/** Renders advisories: HTML and plain text from one set of facts. */
@Injectable()
export class AdvisoryRenderer {
  private readonly templates: Readonly<Record<AdvisoryMatter['kind'], { html: Template; text: Template }>>;

  constructor() {
    const folder = templatesFolder();
    const both = (name: string) => ({ html: compile(folder, name, 'html'), text: compile(folder, name, 'text') });
    this.templates = { release: both('advisory'), stop: both('stop') };
  }

  render(matter: AdvisoryMatter): RenderedAdvisory {
    const facts = advisoryFacts(matter);
    const { html, text } = this.templates[matter.kind];
    return { subject: facts.subject, html: html(facts), text: text(facts) };
  }
}
