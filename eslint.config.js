import js from '@eslint/js';
import prettier from 'eslint-config-prettier';
import svelte from 'eslint-plugin-svelte';
import { defineConfig, globalIgnores } from 'eslint/config';
import globals from 'globals';
import ts from 'typescript-eslint';
import { importBorders } from './scripts/lib/lint/import-borders.mjs';

const ENVIRONMENT =
	'lib/server/config.ts is the only reader of the environment: it checks each variable and says what is wrong. Take what you need from config().';

export default defineConfig(
	globalIgnores(['.svelte-kit/', '.local/', 'build/', 'coverage/']),
	js.configs.recommended,
	...ts.configs.recommended,
	...svelte.configs.recommended,
	prettier,
	...svelte.configs.prettier,
	{
		languageOptions: { globals: { ...globals.browser, ...globals.node } },
		rules: {
			// TypeScript knows undefined names better, those of types and of generated modules too.
			'no-undef': 'off',
			'@typescript-eslint/no-unused-vars': [
				'error',
				{ argsIgnorePattern: '^_', varsIgnorePattern: '^_' }
			],
			'@typescript-eslint/consistent-type-imports': [
				'error',
				// An ambient declaration names a type by import(), there is no other way.
				{ fixStyle: 'inline-type-imports', disallowTypeAnnotations: false }
			],
			eqeqeq: 'error'
		}
	},
	{
		files: ['**/*.svelte', '**/*.svelte.ts'],
		languageOptions: { parserOptions: { parser: ts.parser } },
		rules: {
			// The product stands at the root of its host, and its addresses are plain strings that the
			// interface, reports and mails name too; resolve() would only repeat them.
			'svelte/no-navigation-without-resolve': 'off'
		}
	},
	{
		files: ['src/**/*.{ts,js,svelte}'],
		plugins: { tallyplate: { rules: { 'import-borders': importBorders } } },
		rules: { 'tallyplate/import-borders': 'error' }
	},
	{
		files: ['src/**/*.{ts,js,svelte}'],
		ignores: ['src/lib/server/config.ts'],
		rules: {
			'no-restricted-properties': [
				'error',
				{ object: 'process', property: 'env', message: ENVIRONMENT }
			]
		}
	},
	{
		// JSDoc types of plain scripts: a cast is an inline comment with any.
		files: ['**/*.mjs', '**/*.js'],
		rules: { '@typescript-eslint/no-explicit-any': 'off' }
	}
);
