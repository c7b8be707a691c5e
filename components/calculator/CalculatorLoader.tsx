"use client";
import dynamic from "next/dynamic";
import { Loading } from "@/components/ui/Loading";

/** The calculator and its grammar come in one piece of their own, so that no other page carries them. */
export const CalculatorLoader = dynamic(() => import("./Calculator").then(({ Calculator }) => Calculator), { ssr: false, loading: () => <Loading what="the calculator" /> });
