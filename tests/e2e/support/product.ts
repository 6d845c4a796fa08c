export interface SignIn {
  role: string;
  email: string;
  password: string;
}

/** Where the product under test and its stand-ins are, as the global set-up says. */
export const product = {
  get siteUrl() { return read('E2E_SITE_URL'); },
  get mailUrl() { return read('E2E_MAIL_URL'); },
  get paymentsUrl() { return read('E2E_PAYMENTS_URL'); },
  get databaseUrl() { return read('E2E_DATABASE_URL'); },
};

/** The demo's sign-in for a role at the desk. */
export function signInOf(role: string): SignIn {
  const found = (JSON.parse(read('E2E_SIGN_INS')) as SignIn[]).find((signIn) => signIn.role === role);
  if (found === undefined) throw new Error(`The demo has no sign-in for ${role}.`);
  return found;
}

function read(name: string): string {
  const value = process.env[name];
  if (!value) throw new Error(`${name} is set by the global set-up of the browser tests: run them through Playwright.`);
  return value;
}
