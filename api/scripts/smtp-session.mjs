// One SMTP conversation (RFC 5321): commands in, replies out, messages kept. No network in here.

const LARGEST_MESSAGE_BYTES = 10 * 1024 * 1024;
const LONGEST_LINE_BYTES = 64 * 1024;
const LINE_END = Buffer.from('\r\n');

/** Refusals that can be asked for by the local part of a recipient's address. */
const REFUSALS = {
  'reject-permanent': '550 5.1.1 There is no such mailbox here.',
  'reject-later': '451 4.3.0 The mailbox cannot be reached at the moment, try later.',
};

function addressIn(rest, keyword) {
  return new RegExp(`^${keyword}:\\s*<([^>]*)>`, 'i').exec(rest)?.[1];
}

export class SmtpSession {
  #pending = Buffer.alloc(0);
  #envelope;
  #dataLines; // an array while a message is being received
  #dataBytes = 0;

  /** `reply(line)` sends a reply, `end()` closes the conversation, `keep(message)` stores a message durably. */
  constructor({ reply, end, keep }) {
    Object.assign(this, { reply, end, keep });
  }

  greet() {
    this.reply('220 brimgate-mail ESMTP for trying out');
  }

  /** Takes what arrived, in whatever pieces; pipelined commands are answered in their order. */
  async receive(bytes) {
    this.#pending = Buffer.concat([this.#pending, bytes]);
    for (;;) {
      const end = this.#pending.indexOf(LINE_END);
      if (end < 0) break;
      const line = this.#pending.subarray(0, end);
      this.#pending = this.#pending.subarray(end + LINE_END.length);
      await (this.#dataLines ? this.#dataLine(line) : this.#command(line.toString('utf8')));
    }
    if (this.#pending.length > LONGEST_LINE_BYTES) {
      this.reply('500 5.5.2 That line is too long.');
      this.end();
    }
  }

  async #dataLine(line) {
    if (line.length === 1 && line[0] === 0x2e) return this.#endOfMessage();
    const unstuffed = line[0] === 0x2e ? line.subarray(1) : line;
    this.#dataBytes += unstuffed.length + LINE_END.length;
    if (this.#dataBytes <= LARGEST_MESSAGE_BYTES) this.#dataLines.push(unstuffed, LINE_END);
  }

  async #endOfMessage() {
    const bytes = Buffer.concat(this.#dataLines);
    const isTooLarge = this.#dataBytes > LARGEST_MESSAGE_BYTES;
    const envelope = this.#envelope;
    this.#reset();
    if (isTooLarge) return this.reply('552 5.3.4 The message is too large.');
    try {
      this.reply(`250 2.0.0 Kept as ${await this.keep({ ...envelope, bytes })}`);
    } catch (error) {
      this.reply(`451 4.3.0 The message could not be kept: ${error.code ?? 'unknown reason'}`);
    }
  }

  #reset() {
    this.#envelope = undefined;
    this.#dataLines = undefined;
    this.#dataBytes = 0;
  }

  #command(line) {
    const [, verb = '', rest = ''] = /^([A-Za-z]*) ?(.*)$/.exec(line) ?? [];
    switch (verb.toUpperCase()) {
      case 'EHLO':
        this.#reset();
        return [
          '250-brimgate-mail',
          '250-PIPELINING',
          '250-8BITMIME',
          '250-SMTPUTF8',
          `250 SIZE ${LARGEST_MESSAGE_BYTES}`,
        ].forEach((reply) => this.reply(reply));
      case 'HELO':
        this.#reset();
        return this.reply('250 brimgate-mail');
      case 'MAIL':
        return this.#mail(rest);
      case 'RCPT':
        return this.#recipient(rest);
      case 'DATA':
        return this.#data();
      case 'RSET':
        this.#reset();
        return this.reply('250 2.0.0 Begun again.');
      case 'NOOP':
        return this.reply('250 2.0.0 Still here.');
      case 'QUIT':
        this.reply('221 2.0.0 Goodbye.');
        return this.end();
      default:
        return this.reply('500 5.5.1 That command is not known here.');
    }
  }

  #mail(rest) {
    const sender = addressIn(rest, 'FROM');
    if (sender === undefined) return this.reply('501 5.5.4 Write MAIL FROM:<address>.');
    if (this.#envelope) return this.reply('503 5.5.1 A message has already been begun.');
    const announced = Number(/\bSIZE=(\d+)/i.exec(rest)?.[1] ?? 0);
    if (announced > LARGEST_MESSAGE_BYTES) return this.reply('552 5.3.4 The message is too large.');
    this.#envelope = { sender, recipients: [] };
    return this.reply('250 2.1.0 Sender taken.');
  }

  #recipient(rest) {
    if (!this.#envelope) return this.reply('503 5.5.1 Say MAIL FROM first.');
    const recipient = addressIn(rest, 'TO');
    if (!recipient) return this.reply('501 5.5.4 Write RCPT TO:<address>.');
    const refusal = REFUSALS[recipient.split('@')[0].toLowerCase()];
    if (refusal) return this.reply(refusal);
    this.#envelope.recipients.push(recipient);
    return this.reply('250 2.1.5 Recipient taken.');
  }

  #data() {
    if (!this.#envelope?.recipients.length) return this.reply('503 5.5.1 No recipient was taken.');
    this.#dataLines = [];
    return this.reply('354 Go on, and end with a dot on a line of its own.');
  }
}
