"use client";

export { FailedPage as default } from "@/components/ui/failed-page";
