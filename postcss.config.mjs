/** Tailwind is the only step; its settings are read from app/globals.css. */
const config = { plugins: { '@tailwindcss/postcss': {} } }

export default config
