/** Schemas of the closed lists of names. Apart from the lists, which address matchers take to the browser without zod. */
import { z } from 'zod';
import { ALL_DIVISIONS, MAKERS } from './makers';
import { TABLE_NAMES, type TableName } from './tables';

export const makerSchema = z.enum(MAKERS);
export const divisionSchema = z.enum(ALL_DIVISIONS as [string, ...string[]]);
export const tableNameSchema = z.enum(TABLE_NAMES as [TableName, ...TableName[]]);
