import { randomUUID } from 'node:crypto';
import type { Knex } from 'knex';
import type { Mail, VisitorContext } from '@/lib/usecases/context';
import { testNow } from '@/tests/builders/people';

/** Somebody not signed in, at an address of their own, with a letter box that keeps what is sent. */
export function aVisitor(db: Knex): VisitorContext & { readonly sent: readonly Mail[] } {
  const sent: Mail[] = [];
  return {
    db,
    now: testNow,
    address: randomUUID(),
    origin: 'https://twobow.example.org',
    sent,
    mail: {
      async send(mail) {
        sent.push(mail);
      },
    },
  };
}
