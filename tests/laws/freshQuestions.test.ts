import { describe, expect, it } from "vitest";
import { planCorpus } from "../corpus/planCorpus";
import { everyQuestion, type Questions } from "./exhaustive/everyQuestion";

/** Questions put to each part. */
const ASKED = 14;

/** Numbers that jump about, the same ones every time. */
function* jumping(seed: number): Generator<number> {
  for (let at = seed; ; ) {
    at = (Math.imul(at, 1103515245) + 12345) >>> 0;
    yield at >>> 8;
  }
}

interface Question { readonly move: number; readonly formed: number; readonly pair: number }

function someQuestions({ situation: { moves, part, pairs } }: Questions, seed: number): readonly Question[] {
  const numbers = jumping(seed);
  const next = () => numbers.next().value as number;
  return Array.from({ length: ASKED }, () => {
    const move = next() % moves.length;
    return { move, formed: next() % 2 ** part.bends.length & ~(moves[move]?.mask ?? 0), pair: next() % pairs.length };
  });
}

function answerOf(questions: Questions, { move, formed, pair }: Question) {
  const answer = questions.ask(move, formed, pair);
  const tools = questions.situation.pairs[pair];
  return answer === null ? null : { ...answer, forbidden: [tools?.punch, tools?.die].map((tool) => (tool ? answer.forbidden(tool).map((span) => span.map((z) => z.toFixed(6))) : [])) };
}

describe("what was worked out for one question is right for another", () => {
  it.each(["hat", "tray", "tabs", "corrugated-8", "tray-returns", "small/chain-5", "small/chain-7", "small/tray-return", "small/z-tabs", "small/wide-tab"])("%s: a clearance that has answered much and one made for the question agree", (name) => {
    const request = planCorpus(name);
    const used = everyQuestion(request);
    const questions = someQuestions(used, 1 + name.length);
    const answers = questions.map((question) => answerOf(used, question));
    questions.forEach((question, i) => expect(answerOf(everyQuestion(request), question), JSON.stringify(question)).toEqual(answers[i]));
    expect(answers.some((answer) => answer !== null)).toBe(true);
  });
});
