"use client";
import { useQuery } from "@tanstack/react-query";
import { RotateCcw } from "lucide-react";
import { useEffect } from "react";
import { defaultMethodFactors } from "@/bending/handbook/forceMethods";
import { builtInMaterials } from "@/bending/handbook/materials";
import type { MaterialFacts } from "@/bending/handbook/material";
import { Button } from "@/components/ui/Button";
import { Choice } from "@/components/ui/Choice";
import { LoadProblem } from "@/components/ui/LoadProblem";
import { PageHeader } from "@/components/ui/PageHeader";
import { Select } from "@/components/ui/Select";
import { askQuestion } from "@/lib/calculator/askQuestion";
import type { ChoiceKey } from "@/lib/calculator/choices";
import { commonFields, fieldOf, type FieldKey } from "@/lib/calculator/fields";
import { readFields } from "@/lib/calculator/readFields";
import { sections } from "@/lib/calculator/sections";
import { takenWhenEmpty } from "@/lib/calculator/takenWhenEmpty";
import { parseQuantity } from "@/lib/format/parseQuantity";
import { materialsOptions } from "@/lib/queries/materials";
import { useShopSettings } from "@/lib/queries/shopSettings";
import { shopTableOptions } from "@/lib/queries/shopTable";
import { gaugeSystemOf } from "@/bending/handbook/gaugeSystemOf";
import { ChoiceInput } from "./ChoiceInput";
import { DepthChart } from "./DepthChart";
import { FieldInput } from "./FieldInput";
import { ForceChart } from "./ForceChart";
import { SectionLinks } from "./SectionLinks";
import { SectionView } from "./SectionView";
import { useCalculatorState } from "./useCalculatorState";
import { useShopLimits, type ShopReads } from "./useShopLimits";

/** The trade's daily questions on one page: the sheet and the bend are entered once, each question adds what it needs. */
export function Calculator({ reads }: { readonly reads: ShopReads }) {
  const { state, setText, setMaterial, choose, clear } = useCalculatorState();
  const shop = useQuery({ ...materialsOptions(), enabled: reads.materials });
  const limits = useShopLimits(reads);
  const settings = useShopSettings();
  const materials: readonly MaterialFacts[] = shop.data?.filter(({ id, withdrawn }) => withdrawn === null || id === state.material) ?? builtInMaterials;
  const material = materials.find(({ id }) => id === state.material) ?? materials.find(({ id }) => id === "S235") ?? materials[0];
  const { texts, choices } = state;
  const table = useQuery({ ...shopTableOptions(material?.id ?? ""), enabled: reads.shopTable && material !== undefined });
  const read = material === undefined ? null : readFields(texts, parseQuantity, choices.u, material.group);
  useEffect(() => {
    if (window.location.hash !== "") document.getElementById(window.location.hash.slice(1))?.scrollIntoView();
  }, []);
  if (material === undefined || read === null) return <LoadProblem what="The calculator" error={new Error("The shop has no material yet. Add one first.")} onRetry={() => void shop.refetch()} />;
  const question = askQuestion(read, choices, material, settings.data?.forceFactors ?? defaultMethodFactors, table.data ?? null);
  const gauge = gaugeSystemOf(material.group) ?? undefined;
  const field = (place: string, key: FieldKey) => (
    <FieldInput place={place} name={key} text={texts[key] ?? fieldOf(key).start} units={choices.u} value={read.values[key]} problem={read.problems[key]}
      taken={takenWhenEmpty(key, question)} gauge={key === "t" ? gauge : undefined} onText={(text) => setText(key, text)} />
  );
  const choice = (place: string, key: ChoiceKey) => <ChoiceInput place={place} name={key} value={choices[key]} onChange={(value) => choose(key, value)} />;
  const charts: Readonly<Record<string, React.ReactNode>> = { force: <ForceChart question={question} limits={limits} />, depth: <DepthChart question={question} /> };
  return (
    <>
      <PageHeader kicker="Handbook" title="Calculator" summary="Each answer with its formula, the numbers in it and its source. Fields take sums with units: 3/32 in, 16 ga, 2*1.5 mm, (40+2) mm, 65 ksi."
        actions={<><Choice label="Units" labelHidden value={choices.u} onChange={(value) => choose("u", value)} options={[{ value: "mm", label: "mm, kN" }, { value: "in", label: "inch, tonf" }]} />
          <Button look="plain" icon={<RotateCcw aria-hidden />} onClick={clear}>Start afresh</Button></>} />
      <div className="grid grid-cols-1 gap-x-8 gap-y-6 lg:grid-cols-[17rem_minmax(0,1fr)]">
        <div className="lg:sticky lg:top-4 lg:max-h-[calc(100dvh-2rem)] lg:self-start lg:overflow-y-auto lg:pr-1 lg:pb-2">
          <h2 className="mb-2 border-b border-rule-strong pb-1 font-semibold">The sheet and the bend</h2>
          <div className="grid grid-cols-[repeat(auto-fill,minmax(13rem,1fr))] items-start gap-x-4 gap-y-3">
            <Select id="common-m" label="Material" value={material.id} onChange={setMaterial} options={materials.map(({ id, name }) => ({ value: id, label: name }))}
              {...(state.material !== "" && state.material !== material.id ? { hint: `${state.material} is not a material of this shop; ${material.id} is used.` } : {})} />
            {commonFields.map((key) => <div key={key}>{field("common", key)}</div>)}
          </div>
        </div>
        <div className="min-w-0">
          <SectionLinks />
          {sections.map((section) => <SectionView key={section.id} section={section} question={question} read={read} field={field} choice={choice} chart={charts[section.id]} />)}
        </div>
      </div>
    </>
  );
}
