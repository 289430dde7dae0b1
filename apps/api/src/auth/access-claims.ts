/** What the access token says. */
export interface AccessClaims {
  /** Id of the person. */
  sub: string;
  /** Id of the session. */
  sid: string;
}
