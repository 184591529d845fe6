import { Injectable } from '@nestjs/common';
import type { SessionView, SignInInput } from '@brimgate/rules';
import type { CurrentUser } from '../common/current-user';
import { MembershipNotFound, SignInRefused } from './account.errors';
import { MembershipsService } from './memberships.service';
import { PasswordService } from './password.service';
import { SessionTokens } from './session-tokens';
import { toSessionView } from './session.view';
import { SessionsService } from './sessions.service';

@Injectable()
export class SignInService {
  constructor(
    private readonly passwords: PasswordService,
    private readonly memberships: MembershipsService,
    private readonly sessions: SessionsService,
    private readonly tokens: SessionTokens,
  ) {}

  /** Starts a session under the person's first membership; returns it with what goes in the cookie. */
  async signIn(input: SignInInput, address: string): Promise<{ session: SessionView; cookie: string }> {
    const person = await this.passwords.identify({ ...input, address });
    const memberships = await this.memberships.ofPerson(person.id);
    const first = memberships[0]?.membership;
    if (!first) throw new SignInRefused();
    const token = await this.sessions.start({ personId: person.id, firmId: first.firmId, membershipId: first.id });
    const { sessionId } = await this.sessions.resume(token);
    const endsAt = await this.sessions.endsAt(sessionId);
    const session = toSessionView({ person, membershipId: first.id, memberships, endsAt });
    return { session, cookie: this.tokens.sign(token) };
  }

  async show(user: CurrentUser): Promise<SessionView> {
    const [memberships, endsAt] = await Promise.all([
      this.memberships.ofPerson(user.personId),
      this.sessions.endsAt(user.sessionId),
    ]);
    const person = { uuid: user.personUuid, name: user.name, email: user.email, licence: user.licence };
    return toSessionView({ person, membershipId: user.membershipId, memberships, endsAt });
  }

  /** Lets the same session act under another of the person's memberships. */
  async switchMembership(membershipUuid: string, user: CurrentUser): Promise<SessionView> {
    const memberships = await this.memberships.ofPerson(user.personId);
    const chosen = memberships.find(({ membership }) => membership.uuid === membershipUuid)?.membership;
    if (!chosen) throw new MembershipNotFound();
    await this.sessions.switchMembership(user.sessionId, chosen);
    return this.show({ ...user, membershipId: chosen.id });
  }

  async signOut(user: CurrentUser): Promise<void> {
    await this.sessions.end(user.sessionId);
  }
}
