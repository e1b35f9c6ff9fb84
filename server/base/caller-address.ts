/** Who is counted for limits: the nearest proxy's word, else one bucket for all. */
export function callerAddress(request: { headers: Pick<Headers, 'get'> }): string {
  return request.headers.get('x-forwarded-for')?.split(',').at(-1)?.trim() || 'direct';
}
