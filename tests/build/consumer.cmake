# Installs this build into a scratch folder, builds a program against what was installed and runs
# it. The program prints the version and figures whose values are known (consumer/main.cpp).
file(REMOVE_RECURSE ${SCRATCH})

function(run)
  execute_process(COMMAND ${ARGN} RESULT_VARIABLE status OUTPUT_VARIABLE said ERROR_VARIABLE said)
  if(NOT status EQUAL 0)
    list(JOIN ARGN " " command)
    message(FATAL_ERROR "${command}\n${said}")
  endif()
  set(said "${said}" PARENT_SCOPE)
endfunction()

run(${CMAKE_COMMAND} --install ${BUILD} --prefix ${SCRATCH}/installed)
run(${CMAKE_COMMAND} -S ${SOURCE} -B ${SCRATCH}/built -G ${GENERATOR}
  -DCMAKE_PREFIX_PATH=${SCRATCH}/installed -DCMAKE_BUILD_TYPE=None "-DCMAKE_CXX_FLAGS=${FLAGS}")
run(${CMAKE_COMMAND} --build ${SCRATCH}/built)
run(${SCRATCH}/built/consumer ${VERSION})

run(${SCRATCH}/installed/bin/gainsay --version)
if(NOT said MATCHES "${VERSION}")
  message(FATAL_ERROR "gainsay --version says: ${said}")
endif()

foreach(installed share/man/man1/gainsay.1 share/bash-completion/completions/gainsay
        share/zsh/site-functions/_gainsay share/fish/vendor_completions.d/gainsay.fish)
  file(READ ${SCRATCH}/installed/${installed} text)
  if(NOT text MATCHES "equations")
    message(FATAL_ERROR "${installed} does not know the command 'equations'")
  endif()
endforeach()
