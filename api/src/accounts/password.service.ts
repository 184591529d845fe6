import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import type { CurrentUser } from '../common/current-user';
import { PasswordWrong, SignInRefused } from './account.errors';
import { hashPassword, passwordMatches } from './hashing';
import { PasswordTries } from './password-tries';
import { PersonModel } from './person.model';

@Injectable()
export class PasswordService {
  // What an unknown person's password is compared with, so that the answer takes the same time.
  private readonly nobodysHash = hashPassword('nobody has this password');

  constructor(
    @InjectModel(PersonModel) private readonly people: typeof PersonModel,
    private readonly tries: PasswordTries,
  ) {}

  /** The person behind an address and password; the same refusal whether the person is unknown, inactive or mistaken. */
  async identify({
    email,
    password,
    address,
  }: {
    email: string;
    password: string;
    address: string;
  }): Promise<PersonModel> {
    await this.tries.take(email, address);
    const person = await this.people.findOne({ where: { email } });
    const matches = await passwordMatches(person?.passwordHash ?? (await this.nobodysHash), password);
    if (!person?.isActive || !matches) throw new SignInRefused();
    await this.tries.giveBack(email, address);
    return person;
  }

  /** Asks the signed-in person's password again, for a signature. Throws PasswordWrong or TooManyTries. */
  async verifyPassword(user: Pick<CurrentUser, 'personId'>, password: string): Promise<void> {
    const account = `signature-of-${user.personId}`;
    await this.tries.take(account, account);
    const person = await this.people.findByPk(user.personId);
    if (!person?.isActive || !(await passwordMatches(person.passwordHash, password))) throw new PasswordWrong();
    await this.tries.giveBack(account, account);
  }
}
