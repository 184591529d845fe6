import { PasswordService } from '../src/accounts/password.service';
import { createTestApp, type TestApp } from './support/app';
import { aFirm, aPerson, PASSWORD } from './support/factories';

describe('the password asked again at signing', () => {
  let test: TestApp;
  beforeAll(async () => {
    test = await createTestApp();
  });
  afterAll(() => test.close());

  const passwords = () => test.app.get(PasswordService, { strict: false });
  const aVeterinarian = async () => aPerson(test, await aFirm(test), { role: 'veterinarian' });

  it('is accepted when it is the person’s', async () => {
    const { user } = await aVeterinarian();
    await expect(passwords().verifyPassword(user, PASSWORD)).resolves.toBeUndefined();
  });

  it('is refused at its field when it is not', async () => {
    const { user } = await aVeterinarian();
    await expect(passwords().verifyPassword(user, 'not the password')).rejects.toMatchObject({
      status: 422,
      code: 'password-wrong',
      errors: [{ path: 'password', message: 'This is not your password' }],
    });
  });

  it('is refused to a person who has become inactive', async () => {
    const { user, person } = await aVeterinarian();
    await person.update({ isActive: false });
    await expect(passwords().verifyPassword(user, PASSWORD)).rejects.toMatchObject({ code: 'password-wrong' });
  });

  it('can be mistaken ten times in a quarter of an hour, by this person alone', async () => {
    const [{ user }, other] = [await aVeterinarian(), await aVeterinarian()];
    for (let turn = 0; turn < 10; turn += 1) {
      await expect(passwords().verifyPassword(user, 'a guess')).rejects.toMatchObject({ status: 422 });
    }
    await expect(passwords().verifyPassword(user, PASSWORD)).rejects.toMatchObject({ status: 429 });
    await expect(passwords().verifyPassword(other.user, PASSWORD)).resolves.toBeUndefined();
  });

  it('is not used up by signing rightly', async () => {
    const { user } = await aVeterinarian();
    for (let turn = 0; turn < 12; turn += 1) await passwords().verifyPassword(user, PASSWORD);
  });
});
