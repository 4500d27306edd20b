/** Cells of text in columns of these widths, words wrapped. */
export function printWrapped(cells, widths) {
  const columns = cells.map((cell, column) => wrap(cell, widths[column]));
  const height = Math.max(...columns.map((lines) => lines.length));
  for (let line = 0; line < height; line++) {
    const texts = columns.map((lines, column) => (lines[line] ?? '').padEnd(widths[column]));
    console.log(texts.join('  ').trimEnd());
  }
}

/** Lines of cells in columns as wide as they need to be, figures to the right. */
export function printAligned(lines) {
  const widths = lines[0].map((_, column) => Math.max(...lines.map((line) => line[column].length)));
  for (const line of lines) console.log(line.map((cell, column) => cell.padStart(widths[column])).join('  '));
}

function wrap(text, width) {
  const lines = [''];
  for (const word of text.split(' ')) {
    const line = lines.at(-1);
    if (line !== '' && line.length + 1 + word.length > width) lines.push(word);
    else lines[lines.length - 1] = line === '' ? word : `${line} ${word}`;
  }
  return lines;
}
