/** The password of every demo account. They hold invented data only; the console and the sign-in screen show it. */
export const DEMO_PASSWORD = 'thornwick-demo';
