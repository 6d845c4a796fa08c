import type { Sequelize } from 'sequelize';

/** Keeps the address of someone outside the area; asking twice changes nothing. */
export async function askForArea(sequelize: Sequelize, zip: string, email: string, now: Date): Promise<void> {
  await sequelize.query('INSERT INTO outside_area_requests (zip, email, created_at) VALUES ($zip, $email, $now) ON CONFLICT (zip, email) DO NOTHING', {
    bind: { zip, email: email.toLowerCase(), now },
  });
}
