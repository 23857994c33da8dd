// `server-only` throws outside a React server build; tests run the same modules in plain Node.
export {}
