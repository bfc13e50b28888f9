#pragma once

#include "gainsay/testing/scratch_folder.h"

#include <sys/wait.h>

#include <cstdlib>
#include <string>
#include <vector>

namespace gainsay::testing {

/// What a run of the program left behind.
struct ProgramRun {
  int status = -1;  ///< exit status, or -1 if it was ended by a signal
  std::string out;
  std::string messages;
};

/// A word as the shell reads it back unchanged.
inline std::string quoted(const std::string& word) {
  std::string text = "'";
  for (const char c : word) text += c == '\'' ? std::string("'\\''") : std::string(1, c);
  return text + "'";
}

/// Runs the built gainsay with the rest of a shell's command line, its outputs into files (so
/// neither is a terminal). `before` is put in front: "cd folder &&", "NO_COLOR=1".
inline ProgramRun run_gainsay_line(const std::string& words, const std::string& before = {}) {
  const ScratchFolder scratch;
  const std::string line = before + " " + quoted(GAINSAY_BINARY) + " " + words + " >" +
                           quoted((scratch.path() / "out").string()) + " 2>" +
                           quoted((scratch.path() / "messages").string()) + " </dev/null";
  const int ended = std::system(line.c_str());
  return {.status = WIFEXITED(ended) ? WEXITSTATUS(ended) : -1,
          .out = scratch.read("out"),
          .messages = scratch.read("messages")};
}

/// The same with these arguments, each as it is.
inline ProgramRun run_gainsay(const std::vector<std::string>& arguments,
                              const std::string& before = {}) {
  std::string words;
  for (const std::string& argument : arguments) words += " " + quoted(argument);
  return run_gainsay_line(words, before);
}

}  // namespace gainsay::testing
