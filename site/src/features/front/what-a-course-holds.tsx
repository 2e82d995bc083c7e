import { type FrontView } from '../../api/views.ts';
import { TitleBlock } from '../../ui/title-block.tsx';
import { Quantity } from '../../ui/quantity.tsx';

type Course = NonNullable<FrontView['course']>;

function listItems(course: Course) {
  return [
    {
      quantity: course.units,
      part: 'Units',
      says: 'Each a way of the course map, with its own lamp.',
    },
    {
      quantity: course.sheets,
      part: 'Lesson sheets',
      says: 'One subject to a sheet, drawn, worked through and with its sources.',
    },
    {
      quantity: course.questions,
      part: 'Questions',
      says: 'Fresh figures each time you work one.',
    },
    {
      quantity: course.questions,
      part: 'Worked answers',
      says: 'Line by line beside your own, with the slip named.',
    },
    { quantity: 1, part: 'Paper', says: 'Timed, saved as you write, with a result by subject.' },
    { quantity: 1, part: 'Certificate', says: 'Signed, runs three years. Anyone can check it.' },
  ];
}

interface WhatACourseHoldsProps {
  course: Course;
  school: FrontView['school'];
}

/** The parts list of the drawing above it, with the title block of the course. */
export function WhatACourseHolds({ course, school }: WhatACourseHoldsProps) {
  return (
    <div className="front-items">
      <table>
        <caption className="visually-hidden">What the course holds</caption>
        <thead>
          <tr>
            <th className="number">Item</th>
            <th className="number">Qty</th>
            <th>Part</th>
            <th>Description</th>
          </tr>
        </thead>
        <tbody>
          {listItems(course).map((item, index) => (
            <tr key={item.part}>
              <td className="number">{index + 1}</td>
              <td className="number">{item.quantity}</td>
              <td>{item.part}</td>
              <td>{item.says}</td>
            </tr>
          ))}
        </tbody>
      </table>
      <TitleBlock
        cells={[
          { label: 'Course', value: course.title, span: 6 },
          { label: 'Provider', value: school.name, span: 3 },
          { label: 'Where', value: school.address, span: 3 },
          { label: 'Course no.', value: course.number, span: 3 },
          {
            label: 'To read',
            value: (
              <>
                About <Quantity value={course.minutesToRead} unit="min" />
              </>
            ),
            span: 3,
          },
        ]}
      />
    </div>
  );
}
