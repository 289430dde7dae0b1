export default {
  title: 'Yard',
  greeting: 'Hello, {{name}}',
} as const;
