import { findLink } from '../../server/auth/public-links';
import type { Agent, TestApp } from './app';

/** Starts an intake as a browser does, and says which one it is. */
export async function openIntake({ deps }: Pick<TestApp, 'deps'>, browser: Agent): Promise<{ browser: Agent; intakeId: string }> {
  const response = await browser.post('/api/intakes').expect(200);
  const token = /tidyrun_intake=([\w-]{43})/.exec(String(response.headers['set-cookie']))?.[1] ?? '';
  const link = await findLink(deps.models, 'intake-cookie', token, deps.clock());
  if (!link) throw new Error('A started intake has a cookie');
  return { browser, intakeId: link.intakeId };
}
