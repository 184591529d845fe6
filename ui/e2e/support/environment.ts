/** What the command that runs these tests says about the product it has started. */
function told(name: 'BASE_URL' | 'MAIL_FOLDER' | 'DEMO_PASSWORD'): string {
  const value = process.env[name];
  if (!value) throw new Error(`${name} is not set: run these tests with "npm run test:browser"`);
  return value;
}

export const baseUrl = (): string => told('BASE_URL');
export const mailFolder = (): string => told('MAIL_FOLDER');
export const password = (): string => told('DEMO_PASSWORD');
