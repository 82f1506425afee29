/**
 * Turns every message that rehype-katex leaves behind into a failed build: a formula that cannot
 * be set is a defect of the lesson, not a warning.
 */
export default function rehypeStrict() {
  return (_tree, file) => {
    for (const message of file.messages) {
      if (message.source === 'rehype-katex') file.fail(message.reason, message.place);
    }
  };
}
