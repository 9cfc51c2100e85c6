import { Fragment } from 'react';
import { TagBox } from './TagBox';
import { tagEnd, tagStart } from './tagMarks';

/** A marked sentence with its tags in boxes. `look` is `bold` inside running text, where a box would be too loud. */
export function MarkedText({ text, look = 'box' }: { text: string; look?: 'box' | 'bold' }) {
  return text.split(tagStart).map((part, index) => {
    const [tag, rest] = part.includes(tagEnd) ? part.split(tagEnd) : [undefined, part];
    return (
      <Fragment key={index}>
        {tag !== undefined &&
          (look === 'box' ? <TagBox>{tag}</TagBox> : <b className="font-mono whitespace-nowrap">{tag}</b>)}
        {rest}
      </Fragment>
    );
  });
}
