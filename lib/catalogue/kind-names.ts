import type { Kind } from "@/lib/diagnosis";

/** What a kind is called on screens and in print. */
export const KIND_NAMES: Readonly<Record<Kind, string>> = { potentiometer: "Potentiometer", pwm: "Powered PWM", voltage: "Powered voltage" };
