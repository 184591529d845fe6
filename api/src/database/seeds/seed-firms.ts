import { randomUUID } from 'node:crypto';
import type { INestApplicationContext } from '@nestjs/common';
import type { Transaction } from 'sequelize';
import { hashPassword } from '../../accounts/hashing';
import { MembershipModel } from '../../accounts/membership.model';
import { MembershipYardModel } from '../../accounts/membership-yard.model';
import { PersonModel } from '../../accounts/person.model';
import { TransactionsService } from '../../common/transactions.service';
import { FirmModel } from '../../firms/firm.model';
import { YardModel } from '../../yards/yard.model';
import { happening } from './demo-clock';
import { demoFirms, type DemoFirm, type DemoMember } from './demo-people';

/** Firms, yards, people and memberships: all of them or, when a start was cut off, none. */
export async function seedFirms(app: INestApplicationContext, password: string): Promise<void> {
  if ((await FirmModel.count({ where: { name: demoFirms.map(({ name }) => name) } })) > 0) return;
  const passwordHash = await hashPassword(password);
  await happening(200, () =>
    app.get(TransactionsService).run(async (transaction) => {
      for (const firm of demoFirms) await seedFirm(firm, passwordHash, transaction);
    }),
  );
}

async function seedFirm(
  { name, yards, members }: DemoFirm,
  passwordHash: string,
  transaction: Transaction,
): Promise<void> {
  const firm = await FirmModel.create({ uuid: randomUUID(), name, createdAt: new Date() }, { transaction });
  const rows = await YardModel.bulkCreate(
    yards.map((yard) => ({
      ...yard,
      uuid: randomUUID(),
      firmId: firm.id,
      complianceGate: false,
      capSignOff: 'notice',
      version: 1,
      createdAt: new Date(),
    })),
    { transaction },
  );
  for (const member of members) {
    const person = await personOf(member, passwordHash, transaction);
    const membership = await MembershipModel.create(
      {
        uuid: randomUUID(),
        firmId: firm.id,
        personId: person.id,
        role: member.role,
        isActive: true,
        createdAt: new Date(),
      },
      { transaction },
    );
    const assigned = rows.filter((yard) => member.yards.includes(yard.name));
    await MembershipYardModel.bulkCreate(
      assigned.map((yard) => ({ firmId: firm.id, membershipId: membership.id, yardId: yard.id })),
      { transaction },
    );
  }
}

/** People are global: who works for two firms is one person with two memberships. */
async function personOf(
  { name, email, licence }: DemoMember,
  passwordHash: string,
  transaction: Transaction,
): Promise<PersonModel> {
  const known = await PersonModel.findOne({ where: { email }, transaction });
  if (known) return known;
  return PersonModel.create(
    { uuid: randomUUID(), name, email, licence, passwordHash, isActive: true, createdAt: new Date() },
    { transaction },
  );
}
