import type { Config } from 'tailwindcss';

/** Tokens live in client/styles/app.css as CSS variables; this file only says where class names are found. */
const config: Config = { content: ['./index.html', './client/**/*.{ts,tsx}'], darkMode: 'class' };

export default config;
