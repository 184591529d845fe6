import { readdir, readFile } from 'node:fs/promises';
import { join } from 'node:path';
import { expect } from '@playwright/test';
import { type ParsedMail, simpleParser } from 'mailparser';
import { mailFolder } from './environment';

/** Every mail the product has handed to its mail server, parsed as a mail program does. */
async function mails(): Promise<ParsedMail[]> {
  const names = (await readdir(mailFolder())).filter((name) => name.endsWith('.eml'));
  return Promise.all(names.map(async (name) => simpleParser(await readFile(join(mailFolder(), name)))));
}

/** Waits for the mails to an address whose subject holds these words, and answers with the only one. */
export async function theMail(address: string, words: string): Promise<ParsedMail> {
  let found: ParsedMail[] = [];
  await expect
    .poll(
      async () => {
        found = (await mails()).filter((mail) => addressesOf(mail).includes(address) && mail.subject?.includes(words));
        return found.length;
      },
      { message: `a mail to ${address} about "${words}"`, timeout: 60_000 },
    )
    .toBe(1);
  const [mail] = found;
  if (!mail) throw new Error('the mail that was just there is gone');
  return mail;
}

function addressesOf({ to }: ParsedMail): string[] {
  const fields = to === undefined ? [] : Array.isArray(to) ? to : [to];
  return fields.flatMap((field) => field.value.map(({ address }) => address ?? ''));
}
