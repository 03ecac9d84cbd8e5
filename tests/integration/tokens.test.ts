import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { NotFoundError } from '@/lib/errors';
import { authenticateToken } from '@/lib/usecases/tokens/authenticate-token';
import { createToken } from '@/lib/usecases/tokens/create-token';
import { listTokens } from '@/lib/usecases/tokens/list-tokens';
import { revokeToken } from '@/lib/usecases/tokens/revoke-token';
import { addPerson, testNow } from '@/tests/builders/people';
import { createTestDatabase, type TestDatabase } from './helpers/database';

let database: TestDatabase;
beforeAll(async () => {
  database = await createTestDatabase();
});
afterAll(() => database.drop());

describe('personal tokens', () => {
  it('name their person until revoked', async () => {
    const person = await addPerson(database.db, 'Person');
    const { id, token } = await createToken(person, 'Chart table');
    expect(await authenticateToken(database.db, token, testNow)).toEqual(person.user);
    expect(await listTokens(person)).toMatchObject([{ id, name: 'Chart table', lastUsedAt: testNow, revokedAt: null }]);
    await revokeToken(person, id);
    expect(await authenticateToken(database.db, token, testNow)).toBeNull();
    expect(await listTokens(person)).toMatchObject([{ revokedAt: testNow }]);
    await expect(revokeToken(person, id)).rejects.toBeInstanceOf(NotFoundError);
  });

  it('are 256 random bits, stored hashed', async () => {
    const person = await addPerson(database.db, 'Person');
    const { token } = await createToken(person, 'One');
    expect(token).toMatch(/^twobow_[\w-]{43}$/);
    const { rows } = await database.db.raw<{ rows: { text: string }[] }>(
      'SELECT personal_tokens::text AS text FROM personal_tokens',
    );
    expect(rows.some((row) => row.text.includes(token.slice(7)))).toBe(false);
  });

  it('cannot be revoked by somebody else', async () => {
    const person = await addPerson(database.db, 'Person');
    const other = await addPerson(database.db, 'Other');
    const { id, token } = await createToken(person, 'Mine');
    await expect(revokeToken(other, id)).rejects.toBeInstanceOf(NotFoundError);
    await expect(revokeToken(other, 'no-id')).rejects.toBeInstanceOf(NotFoundError);
    expect(await authenticateToken(database.db, token, testNow)).not.toBeNull();
    expect(await listTokens(other)).toEqual([]);
  });

  it.each(['', 'twobow_', 'Bearer', `twobow_${'A'.repeat(43)}`, 'x'.repeat(10_000)])('are not %j', async (text) => {
    expect(await authenticateToken(database.db, text, testNow)).toBeNull();
  });

  it('are at most twenty at a time', async () => {
    const person = await addPerson(database.db, 'Person');
    for (let i = 0; i < 20; i += 1) await createToken(person, `Token ${i}`);
    await expect(createToken(person, 'One more')).rejects.toMatchObject({ fields: [{ pointer: '/name' }] });
  });
});
