// Set before any module reads it: demo sign-ins, response validation and quiet logs depend on it.
process.env.NODE_ENV = 'test';
process.env.TZ = 'UTC';
