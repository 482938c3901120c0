import { describe, expectTypeOf, it } from 'vitest';
import type { z } from 'zod';
import type { fieldErrorSchema, readAnswerSchema, readingFieldSchema } from './api';
import type { AnsweredReading, ReadAnswer, ReadingField } from './readings';

describe('the schemas of answers', () => {
	it('promise what the types of readings say, member by member', () => {
		type Answer = z.infer<typeof readAnswerSchema>;
		expectTypeOf<Answer>().toExtend<ReadAnswer>();
		expectTypeOf<keyof Answer>().toEqualTypeOf<keyof ReadAnswer>();
		expectTypeOf<keyof Answer['readings'][number]>().toEqualTypeOf<keyof AnsweredReading>();
		expectTypeOf<keyof z.infer<typeof readingFieldSchema>>().toEqualTypeOf<keyof ReadingField>();
		expectTypeOf<keyof z.infer<typeof fieldErrorSchema>>().toEqualTypeOf<
			'field' | 'code' | 'message' | 'accepted'
		>();
	});
});
