import { resolve } from 'node:path';

// It is built in a folder of the project's own, three levels under it, where React and Next.js are found.
const root = resolve(import.meta.dirname, '../../..');

/** @type {import('next').NextConfig} */
export default { outputFileTracingRoot: root, turbopack: { root }, poweredByHeader: false };
