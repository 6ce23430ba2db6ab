/** What every sheet of the shop says at its foot. */
export function Footer() {
  return (
    <footer className="site-footer">
      <p>
        Figures come from models with the accuracy said beside them: cut a test piece, measure, then
        glue. Follow the tool maker’s instructions, local codes and licensed practice.
      </p>
    </footer>
  );
}
