#pragma once

#include "gainsay/cli/contenders.h"
#include "gainsay/cli/judgement.h"
#include "gainsay/cli/markup.h"

#include <string>
#include <vector>

namespace gainsay::cli {

/// What every section of the report is written from.
struct Page {
  const Judgement& judgement;
  std::vector<Contender> contenders;

  explicit Page(const Judgement& of) : judgement(of), contenders(line_up(of)) {}
  const Study& study() const { return judgement.study; }
};

/// One section: its name and how to read it in the margin, the evidence beside them.
struct Section {
  std::string id;
  std::string heading;
  Markup note;
  Markup evidence;
};

Markup section(const Section& section);

/// A table of numbers. The first column heads its rows; `words` tells which columns hold words
/// (left aligned) rather than figures.
struct NumberTable {
  std::string caption;
  std::vector<std::string> heads;
  std::vector<bool> words;
  std::vector<std::vector<std::string>> rows;
};

Markup table(const NumberTable& numbers);

/// The numbers of a picture, folded away.
Markup folded(const std::string& summary, const Markup& content);

/// The letter of a hypothesis in its hue, and its name.
Markup letter_and_name(const Contender& contender);

/// Filled: not rejected; open: rejected; half filled: undecided; nothing: not judged.
Markup verdict_shape(const Contender& contender);
std::string verdict_word(const Contender& contender);

/// A paragraph.
Markup paragraph(const std::string& words);

}  // namespace gainsay::cli
