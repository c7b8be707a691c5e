"use client";
import { Tabs } from "radix-ui";
import type { ReactNode } from "react";

interface TabSetProps {
  readonly label: string;
  readonly tabs: readonly { readonly value: string; readonly label: ReactNode; readonly content: ReactNode }[];
  readonly value?: string;
  readonly onChange?: (value: string) => void;
}

export function TabSet({ label, tabs, value, onChange }: TabSetProps) {
  const control = value === undefined ? { defaultValue: tabs[0]?.value ?? "" } : { value };
  return (
    <Tabs.Root {...control} {...(onChange === undefined ? {} : { onValueChange: onChange })}>
      <Tabs.List aria-label={label} className="flex flex-wrap gap-x-6 border-b border-rule-strong">
        {tabs.map((tab) => (
          <Tabs.Trigger key={tab.value} value={tab.value}
            className="-mb-px min-h-10 border-b-2 border-transparent px-0.5 font-medium text-ink-soft hover:text-ink data-[state=active]:border-accent data-[state=active]:text-ink">
            {tab.label}
          </Tabs.Trigger>
        ))}
      </Tabs.List>
      {tabs.map((tab) => <Tabs.Content key={tab.value} value={tab.value} className="pt-4">{tab.content}</Tabs.Content>)}
    </Tabs.Root>
  );
}
