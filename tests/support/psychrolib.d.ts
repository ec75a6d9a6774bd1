declare module 'psychrolib' {
  const psychrolib: Record<string, (...args: number[]) => number> & { SI: number };
  export default psychrolib;
}
