/** The password of every demo account; they hold invented data only, and the console says it at each start. */
export const DEMO_PASSWORD = 'thornwick-demo';
