"use client";

import { zodResolver } from "@hookform/resolvers/zod";
import { useState } from "react";
import { useForm } from "react-hook-form";
import { durationText } from "@/lib/client/time-words";
import { destination, leaveFor, signIn } from "@/lib/client/session";
import { credentialsShape, type Credentials } from "@/lib/domain/member";
import { refusalSentence, signInWords } from "@/lib/domain/messages/session";
import { Button } from "../ui/button";
import { TextField } from "../ui/text-field";

// The focus ring is wider than the gap that a field leaves around its input.
const spaced = "[&_label]:mb-1.5 [&_p]:mt-1.5";

/** Address and password. What the server turns down stands above the button, what is missing at its field. */
export function SignInForm() {
  const [shown, setShown] = useState(false);
  const { register, handleSubmit, formState, setError, resetField, setFocus } = useForm<Credentials>({
    resolver: zodResolver(credentialsShape),
    defaultValues: { email: "", password: "" },
  });
  const { errors, isSubmitting, isSubmitSuccessful } = formState;
  const busy = isSubmitting || isSubmitSuccessful;

  const submit = handleSubmit(async (credentials) => {
    const answer = await signIn(credentials);
    if (answer.kind === "answered") {
      const wanted = new URLSearchParams(window.location.search).get("then");
      return leaveFor(destination(answer.value.member.role, wanted));
    }
    if (answer.kind === "unreached") return setError("root", { message: signInWords.unreached });
    const wait = answer.retryAfterS === null ? null : durationText(Math.max(1, answer.retryAfterS) * 1000);
    if (answer.problem.code === "wrong-credentials") {
      resetField("password");
      setFocus("password");
    }
    setError("root", { message: refusalSentence(answer.problem.code, wait) });
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
        label={signInWords.email}
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
          label={signInWords.password}
          type={shown ? "text" : "password"}
          autoComplete="current-password"
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
          {shown ? signInWords.hide : signInWords.show}
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
        {busy ? signInWords.submitting : signInWords.submit}
      </Button>
    </form>
  );
}
