/** The part of mailparser that the tests use; the package brings no types of its own. */
declare module 'mailparser' {
  export interface AddressField {
    value: { address?: string; name: string }[];
  }

  export interface ParsedMail {
    subject?: string;
    from?: AddressField;
    to?: AddressField | AddressField[];
    text?: string;
    html: string | false;
    messageId?: string;
  }

  export function simpleParser(source: Buffer): Promise<ParsedMail>;
}
