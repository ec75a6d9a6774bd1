/** Only a path of this site may follow a sign-in: neither another site's nor one that a browser would read as one. */
export function pathAfter(wanted: string | undefined): string {
  return wanted && /^\/(?![/\\])[^\\\s]*$/.test(wanted) ? wanted : '/gardens';
}
