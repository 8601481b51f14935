// React picks its build from NODE_ENV when it is first imported, so it is set before any import.
process.env.NODE_ENV = 'production';
await import('../dist/server/main.js');
