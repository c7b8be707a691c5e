import { headers } from "next/headers";
import { cache } from "react";
import { readPerson } from "./readPerson";

/** Whoever asks for the page that is being made; asked once however many layouts and pages need it. */
export const currentPerson = cache(async () => readPerson(await headers()));
