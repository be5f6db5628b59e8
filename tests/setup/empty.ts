// Stands in for `server-only` in tests: outside a bundler that package throws on import.
export {}
