import { loggable } from '@/server/http/loggable';
import { freshDatabase } from '@/tests/helpers/database';

describe('loggable', () => {
  it('keeps code and constraint of a database error and leaves out the values it met', async () => {
    const { db, drop } = await freshDatabase();
    const person = { email: 'petra@hollings.example', name: 'Petra', password_hash: 'x' };
    await db('people').insert(person);
    const failure = await db('people')
      .insert(person)
      .catch((error: unknown) => error);
    await drop();

    // The address stands in the error itself, or this test would show nothing.
    expect(JSON.stringify(failure)).toContain('petra@hollings.example');
    expect(loggable(failure)).toMatchObject({ code: '23505', constraint: 'people_email_key', table: 'people' });
    expect(JSON.stringify(loggable(failure))).not.toContain('hollings');
  });

  it('says of what is no error only what it is', () => {
    expect(loggable('petra@hollings.example')).toEqual({ type: 'string' });
  });
});
