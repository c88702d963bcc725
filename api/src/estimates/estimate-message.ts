/** What a thread says when a task has ended. */
export type EstimateMessage =
  { readonly kind: 'done'; readonly json: string } | { readonly kind: 'failed'; readonly message: string };
