import { QueryTypes } from 'sequelize';
import type { Database } from './connection';

const HEAD = `-- The schema that the migrations make. Written by npm run db:migrate -- --dump; do not edit.
SET FOREIGN_KEY_CHECKS = 0;
`;
const FOOT = `SET FOREIGN_KEY_CHECKS = 1;
`;

/** The schema of a database as SQL: its tables by name, without the ledger of migrations. */
export async function dumpSchema({ sequelize }: Database): Promise<string> {
	const tables = await sequelize.query<{ name: string }>(
		`SELECT table_name AS name FROM information_schema.tables
		WHERE table_schema = DATABASE() AND table_type = 'BASE TABLE' AND table_name <> 'migrations'
		ORDER BY table_name`,
		{ type: QueryTypes.SELECT }
	);
	const parts: string[] = [];
	for (const { name } of tables) {
		const [shown] = await sequelize.query<{ 'Create Table': string }>(
			`SHOW CREATE TABLE \`${name}\``,
			{ type: QueryTypes.SELECT }
		);
		parts.push(`${shown?.['Create Table'].replace(/ AUTO_INCREMENT=\d+/, '')};\n`);
	}
	return [HEAD, ...parts, FOOT].join('\n');
}
