// @ts-check
import { serverPrograms } from '../pg/programs.mjs';
import { onPath } from './debian-packages.mjs';

/** @type {import('./debian-packages.mjs').DebianPackage} */
export const POSTGRESQL = {
  name: 'postgresql',
  present: () => serverPrograms() !== null,
  insteadOf: 'set DATABASE_URL to a PostgreSQL server you have',
};

/** @type {import('./debian-packages.mjs').DebianPackage} */
export const CHROMIUM = { name: 'chromium', present: () => onPath('chromium') !== null };

/** Its pdftotext and pdftoppm read printed sheets back. @type {import('./debian-packages.mjs').DebianPackage} */
export const POPPLER = {
  name: 'poppler-utils',
  present: () => ['pdftotext', 'pdftoppm', 'pdffonts'].every((program) => onPath(program) !== null),
};
