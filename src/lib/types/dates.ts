import { z } from 'zod';

/**
 * What a date says happened on that day.
 * - `cast`: the iron was poured; `part_made`: a bought or small part was made; `unit_assembled`: engine, gearbox, axle.
 * - `designed`: the year of a part number, which is that of the drawing.
 * - `body_finished`: body completed or its tag issued; `scheduled`: planned for building; `car_finished`: left the line.
 * - `label_month`: month of manufacture on a certification label.
 */
export const DATED = [
	'cast',
	'part_made',
	'unit_assembled',
	'designed',
	'body_finished',
	'scheduled',
	'car_finished',
	'label_month'
] as const;
export const datedSchema = z.enum(DATED);
export type Dated = z.infer<typeof datedSchema>;
