#pragma once

#include "gainsay/testing/scratch_folder.h"

#include <sys/wait.h>

#include <cstdlib>
#include <string>

namespace gainsay::testing {

/// What Chromium made of a page: the document after its scripts ran, and what it logged.
struct Visited {
  int status = -1;  ///< exit status of the browser
  std::string dom;
  std::string log;  ///< holds a line with "CONSOLE" for each message of the page
};

/// A headless Chromium with an empty profile of its own, and pages in a folder of its own.
class Chromium {
 public:
  /// Opens the page and returns its document.
  Visited open(const std::string& html) const {
    folder_.write("page.html", html);
    Visited visited;
    visited.status = run("--dump-dom");
    visited.dom = folder_.read("out");
    visited.log = folder_.read("log");
    return visited;
  }

  /// A picture of the page as PNG: equal pages give equal bytes.
  std::string picture(const std::string& html, int width, int height) const {
    folder_.write("page.html", html);
    run("--hide-scrollbars --window-size=" + std::to_string(width) + "," + std::to_string(height) +
        " --screenshot='" + (folder_.path() / "page.png").string() + "'");
    return folder_.read("page.png");
  }

  /// The page on paper, as PDF.
  std::string paper(const std::string& html) const {
    folder_.write("page.html", html);
    run("--no-pdf-header-footer --print-to-pdf='" + (folder_.path() / "page.pdf").string() + "'");
    return folder_.read("page.pdf");
  }

 private:
  int run(const std::string& what) const {
    const std::string path = folder_.path().string();
    const std::string command =
        "/usr/bin/chromium --headless --no-sandbox --disable-gpu --disable-quic --no-first-run"
        " --disable-background-networking --disable-component-update --disable-sync"
        " --enable-logging=stderr --virtual-time-budget=5000 --user-data-dir='" +
        path + "/profile' " + what + " 'file://" + path + "/page.html' >'" + path + "/out' 2>'" +
        path + "/log'";
    const int status = std::system(command.c_str());
    return WIFEXITED(status) ? WEXITSTATUS(status) : -1;
  }

  ScratchFolder folder_;
};

/// The page with `script` run after its own, under no policy: for tests that act like a reader. The
/// script leaves what it finds in document.title.
inline std::string with_reader(std::string html, const std::string& script) {
  const std::size_t policy = html.find("<meta http-equiv=");
  html.erase(policy, html.find('>', policy) + 1 - policy);
  return html.insert(html.find("</body>"), "<script>" + script + "</script>");
}

/// The page as one sees it who lets no script run.
inline std::string without_scripts(std::string html) {
  for (std::size_t at = html.find("<script"); at != std::string::npos; at = html.find("<script")) {
    constexpr std::size_t kEndTag = 9;
    html.erase(at, html.find("</script>", at) + kEndTag - at);
  }
  return html;
}

}  // namespace gainsay::testing
