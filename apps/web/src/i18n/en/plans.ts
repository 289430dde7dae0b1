export default {} as const;
