import type { SlipContent } from './slip.tsx';

/** The slip as a plain table with no look of its own: for feeds, mail and print. */
export function SlipTable({ word, note, lines, text, sum, footnote }: SlipContent) {
  const caption = note ? `${word} ${note}` : word;
  return (
    <>
      {text?.map((part, index) => (
        <p key={part.words}>
          {index === 0 && <strong>{word}. </strong>}
          {part.lead && <em>{part.lead}: </em>}
          {part.words}
        </p>
      ))}
      {(lines.length > 0 || sum) && (
        <table>
          <caption>{caption}</caption>
          <tbody>
            {lines.map((line, index) => (
              <tr key={index}>
                <th scope="row">{line.label}</th>
                <td>{line.small}</td>
                <td>{line.value}</td>
              </tr>
            ))}
          </tbody>
          {sum && (
            <tfoot>
              <tr>
                <th scope="row" colSpan={2}>
                  {sum.label}
                </th>
                <td>{sum.value}</td>
              </tr>
            </tfoot>
          )}
        </table>
      )}
      {footnote && <p>{footnote}</p>}
    </>
  );
}
