import { Link2 } from "lucide-react";
import type { ReactNode } from "react";
import { Notice } from "@/components/ui/Notice";
import type { ChoiceKey } from "@/lib/calculator/choices";
import { fieldOf, type FieldKey } from "@/lib/calculator/fields";
import type { Question } from "@/lib/calculator/question";
import type { ReadFields } from "@/lib/calculator/readFields";
import type { Section } from "@/lib/calculator/section";
import { AnswerRow } from "./AnswerRow";
import { SectionLine } from "./SectionLine";

interface SectionViewProps {
  readonly section: Section;
  readonly question: Question;
  readonly read: ReadFields;
  readonly field: (place: string, key: FieldKey) => ReactNode;
  readonly choice: (place: string, key: ChoiceKey) => ReactNode;
  readonly chart?: ReactNode;
}

/** One question: its own inputs, and under them the answers, or which field has to be mended first. */
export function SectionView({ section, question, read, field, choice, chart }: SectionViewProps) {
  const { id, title, fields, choices, needs } = section;
  const wrong = [...new Set([...needs, ...fields])].filter((key) => read.problems[key] !== undefined);
  return (
    <section id={id} aria-labelledby={`${id}-title`} className="scroll-mt-4 border-t-2 border-ink pt-2 pb-8">
      <div className="mb-3 flex flex-wrap items-baseline gap-x-4">
        <h2 id={`${id}-title`} className="text-lg font-semibold"><a href={`#${id}`} className="group inline-flex items-center gap-1.5">{title}<Link2 aria-hidden className="size-4 text-steel-400 group-hover:text-ink" /></a></h2>
        <p className="text-ink-soft">{section.question}</p>
      </div>
      {fields.length + choices.length === 0 ? null : (
        <div className="mb-4 grid grid-cols-[repeat(auto-fill,minmax(13rem,1fr))] items-start gap-x-4 gap-y-3 border border-rule bg-wash/50 p-3">
          {choices.map((key) => <div key={key}>{choice(id, key)}</div>)}
          {fields.map((key) => <div key={key}>{field(id, key)}</div>)}
        </div>
      )}
      {wrong.length > 0 ? (
        <Notice tone="wrong" title={`Waiting for ${wrong.map((key) => fieldOf(key).label).join(", ")}`}>{wrong.map((key) => <p key={key}>{read.problems[key]}</p>)}</Notice>
      ) : <Answers section={section} question={question} chart={chart} />}
    </section>
  );
}

function Answers({ section, question, chart }: { readonly section: Section; readonly question: Question; readonly chart?: ReactNode }) {
  const units = question.choices.u;
  return (
    <div className="space-y-5">
      {section.answer(question).map((group, i) => (
        <div key={i}>
          {group.title === undefined ? null : <SectionLine>{group.title}</SectionLine>}
          <ul>{group.answers.filter(({ value }) => Number.isFinite(value)).map((answer) => <AnswerRow key={answer.label} answer={answer} group={group.title} units={units} />)}</ul>
          {group.remark === undefined ? null : <div className="mt-2"><Notice tone={group.remark.tone} title={group.remark.text} /></div>}
        </div>
      ))}
      {chart}
    </div>
  );
}
