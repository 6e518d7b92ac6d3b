"use client";

import { zodResolver } from "@hookform/resolvers/zod";
import { useState } from "react";
import { useForm } from "react-hook-form";
import { join } from "@/lib/client/invitations";
import { destination, leaveFor } from "@/lib/client/session";
import { joinShape, type Join } from "@/lib/domain/invitation";
import { signUpWords } from "@/lib/domain/messages/account";
import { joinWords as words } from "@/lib/domain/messages/people";
import { Button } from "../ui/button";
import { TextField } from "../ui/text-field";
import { refusedSignUp } from "./refused-sign-up";

// The focus ring is wider than the gap that a field leaves around its input.
const spaced = "[&_label]:mb-1.5 [&_p]:mt-1.5";

type JoinFormProps = { token: string; gone: () => void };

/** Name, address and a long password of someone who was invited. */
export function JoinForm({ token, gone }: JoinFormProps) {
  const [shown, setShown] = useState(false);
  const { register, handleSubmit, formState, setError, setFocus } = useForm<Join>({
    resolver: zodResolver(joinShape),
    defaultValues: { name: "", email: "", password: "" },
  });
  const { errors, isSubmitting, isSubmitSuccessful } = formState;
  const busy = isSubmitting || isSubmitSuccessful;

  const submit = handleSubmit(async (typed) => {
    const answer = await join(token, typed);
    if (answer.kind === "answered") return leaveFor(destination(answer.value.member.role, null));
    if (answer.kind === "refused" && answer.problem.code === "not-found") return gone();
    const { field, message } = refusedSignUp(answer);
    setError(field, { message });
    if (field !== "root") setFocus(field);
  });

  return (
    // Before the page's script has run a browser submits by itself: never with the password in the address.
    <form
      method="post"
      noValidate
      onSubmit={(event) => void (busy ? event.preventDefault() : submit(event))}
      className="mt-6 flex flex-col gap-5"
    >
      <TextField
        className={spaced}
        label={signUpWords.name}
        hint={signUpWords.nameHint}
        autoComplete="name"
        error={errors.name?.message}
        {...register("name")}
      />
      <TextField
        className={spaced}
        label={signUpWords.email}
        type="email"
        inputMode="email"
        autoComplete="username"
        autoCapitalize="none"
        spellCheck={false}
        error={errors.email?.message}
        {...register("email")}
      />
      <div className="flex flex-col items-start">
        <TextField
          className={`w-full ${spaced}`}
          label={signUpWords.password}
          hint={signUpWords.passwordHint}
          type={shown ? "text" : "password"}
          autoComplete="new-password"
          autoCapitalize="none"
          spellCheck={false}
          error={errors.password?.message}
          {...register("password")}
        />
        <button
          type="button"
          onClick={() => setShown(!shown)}
          className="-ml-1 inline-flex min-h-11 items-center px-1 font-semibold underline decoration-2 underline-offset-4"
        >
          {shown ? signUpWords.hide : signUpWords.show}
        </button>
      </div>
      {errors.root && (
        <p role="alert" className="border-l-8 border-ink bg-shade px-4 py-3 font-semibold">
          {errors.root.message}
        </p>
      )}
      <Button
        type="submit"
        variant="good"
        size="desk"
        aria-disabled={busy || undefined}
        className="min-h-14 text-lg"
      >
        {busy ? words.submitting : words.submit}
      </Button>
    </form>
  );
}
