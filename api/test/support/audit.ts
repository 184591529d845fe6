import type { Operation } from './operation';

/** What the audit trail says was done with a subject, oldest first. */
export async function auditActs({ administrator }: Operation, subjectId: string): Promise<string[]> {
  const response = await administrator.agent.get(`/api/audit-events?subjectId=${subjectId}&limit=100`).expect(200);
  return (response.body as { items: { act: string }[] }).items.map(({ act }) => act).toReversed();
}
