import type { Knex } from 'knex';

/** Who asks, when, and of which database. Every use case of signed-in people takes it first. */
export interface Context {
  readonly db: Knex;
  readonly user: { readonly id: string; readonly email: string; readonly name: string };
  readonly now: Date;
}

export interface Mail {
  readonly to: string;
  /** Plain ASCII. */
  readonly subject: string;
  readonly text: string;
}

export interface MailSender {
  send(mail: Mail): Promise<void>;
}

/** Of somebody who is not signed in (yet). */
export interface VisitorContext {
  readonly db: Knex;
  readonly now: Date;
  /** The client's address, by which tries are counted. */
  readonly address: string;
  readonly mail: MailSender;
  /** Our own address, for links in mails: "https://twobow.example.org". */
  readonly origin: string;
}
