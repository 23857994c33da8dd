/** A first statement to the investigators: the comments reviewers wrote for them, unsigned, each its own paragraph. */
export function statementFrom(comments: readonly string[]): string {
  return comments
    .map((comment) => comment.trim().replace(/\n{3,}/g, '\n\n'))
    .filter((comment, index, all) => comment !== '' && all.indexOf(comment) === index)
    .join('\n\n')
    .slice(0, 8000)
}
